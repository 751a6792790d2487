import type { ReactNode } from 'react';
import { X } from 'lucide-react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { FleetRow } from '../../../server/contract/fleet';
import type { FreezerPage } from '../../../server/contract/freezers';
import { api } from '../../../server/contract/index';
import { Problem } from '../../api/call';
import { q } from '../../api/query';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { IconButton, buttonClass } from '../../ui/button';
import { Skeleton } from '../../ui/skeleton';
import { BesideFacts } from './beside-facts';
import { BesideLevel } from './beside-level';
import { StandingTag } from './standing-tag';
import { useStanding } from './use-standing';

interface Props {
  freezerId: string;
  /** As the list has it; absent where it is on another page of the list. */
  row: FleetRow | undefined;
  now: number;
  everyMs: number;
  close: () => void;
}

/** One freezer beside the list. */
export function Beside({ freezerId, row, now, everyMs, close }: Props) {
  const { t } = useTranslation('freezers');
  const { slug } = useMembership().producer;
  const standingOf = useStanding();
  const { data, error } = useQuery(q(api.freezers.read, { params: { producer: slug, freezerId } }, { everyMs }));
  const title = data ? data.store.name : row?.store;
  return (
    <aside aria-label={t('beside.label')} className="min-h-0 overflow-y-auto rounded-card border border-rule bg-surface p-4">
      <div className="flex items-start justify-between gap-2">
        <div className="min-w-0">
          <h2 className="text-lead font-bold wrap-anywhere">{title ?? t('beside.label')}</h2>
          <p className="text-ink-2">{data ? data.freezer.name : row?.name}</p>
        </div>
        <IconButton label={t('beside.close')} icon={<X aria-hidden size={20} />} onClick={close} />
      </div>
      {row && (
        <div className="mt-1.5 empty:hidden">
          <StandingTag standing={standingOf(row, now)} now={now} />
        </div>
      )}
      {data ? <Found found={data} now={now} /> : error instanceof Problem ? <ProblemNote problem={error} /> : <Waiting />}
    </aside>
  );
}

function Found({ found, now }: { found: FreezerPage; now: number }) {
  const { t } = useTranslation('freezers');
  const { slug } = useMembership().producer;
  return (
    <>
      <Links>
        <Link to={paths.freezer(slug, found.freezer.id)} className={buttonClass('quiet')}>
          {t('beside.whole')}
        </Link>
        <Link to={paths.store(slug, found.store.id)} className={buttonClass('quiet')}>
          {t('beside.store')}
        </Link>
      </Links>
      <BesideLevel freezer={found.freezer} now={now} />
      <BesideFacts found={found} now={now} />
    </>
  );
}

const Links = ({ children }: { children: ReactNode }) => <div className="mt-3 mb-4 flex flex-wrap gap-2">{children}</div>;

const Waiting = () => (
  <div className="mt-3 grid gap-3">
    <Skeleton className="h-11" />
    <Skeleton className="h-88" />
    <Skeleton className="h-40" />
  </div>
);
