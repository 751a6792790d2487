import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { FleetColumn } from '../../../server/contract/fleet';
import type { Result } from '../../../server/contract/endpoint';
import type { api } from '../../../server/contract/index';
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
  const { t } = useTranslation('freezers');
  const [search] = useSearchParams();
  const steady = useSteadyRows(list.freezers, JSON.stringify(listQuery(search)));
  return (
    <div className="min-h-0 lg:flex lg:h-full lg:flex-col">
      {steady.rows.length === 0 ? <NoFreezers /> : <FleetTable rows={steady.rows} columns={columns} open={open} now={now} />}
      {/* Below the rows, which it must not push away; on a phone it stays in sight. */}
      <p role="status" className="mt-2 text-ink-2 empty:hidden max-lg:sticky max-lg:bottom-20 max-lg:z-10 max-lg:rounded-control max-lg:border max-lg:border-edge max-lg:bg-surface max-lg:px-4">
        {steady.moved && (
          <>
            {t('moved.words')}{' '}
            <button type="button" onClick={steady.showNewest} className="min-h-12 font-semibold text-fjord underline underline-offset-4 lg:min-h-8">
              {t('moved.show')}
            </button>
          </>
        )}
      </p>
      <Pager next={list.next} />
    </div>
  );
}
