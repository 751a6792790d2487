import { useSearchParams } from 'react-router-dom';
import type { FleetColumn } from '../../../server/contract/fleet';
import type { Result } from '../../../server/contract/endpoint';
import type { api } from '../../../server/contract/index';
import { useMembership } from '../../lib/me';
import { MovedNote } from '../../table/moved-note';
import { Pager } from '../../table/pager';
import { useSteadyRows } from '../../table/use-steady-rows';
import { FleetTable } from './fleet-table';
import { listQuery } from './fleet-query';
import { NoFreezers } from './no-freezers';
import type { Open } from './use-open';

interface Props {
  list: Result<typeof api.freezers.list>;
  columns: FleetColumn[];
  open: Open;
  now: number;
}

/** The rows as the reader found them, and a word when they would stand otherwise. */
export function FleetList({ list, columns, open, now }: Props) {
  const { slug } = useMembership().producer;
  const [search] = useSearchParams();
  const steady = useSteadyRows(list.freezers, JSON.stringify([slug, listQuery(search)]));
  return (
    <div className="min-h-0 lg:flex lg:h-full lg:flex-col">
      {steady.rows.length === 0 ? <NoFreezers /> : <FleetTable rows={steady.rows} columns={columns} open={open} now={now} />}
      <MovedNote moved={steady.moved} showNewest={steady.showNewest} />
      <Pager next={list.next} />
    </div>
  );
}
