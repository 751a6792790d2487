import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { truckToCome } from '../../../server/domain/answers';
import { standingOf } from '../../../server/domain/freezer-standing';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { FreezerSeen } from './freezer-seen';
import { FreezerTag } from './freezer-tag';
import { useKnown } from './store-known';

interface Props {
  freezer: Freezer;
  found: StorePage;
  now: number;
}

/** One freezer: its name, how it stands, and what is seen into it. */
export function FreezerCard({ freezer, found, now }: Props) {
  const standing = standingOf(freezer, truckToCome(useKnown(found)), now, found.store.timeZone);
  const heading = `freezer-${freezer.id}`;
  return (
    <article aria-labelledby={heading} className="rounded-card border border-rule bg-surface px-4 py-4 sm:px-5">
      <div className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1.5">
        <h2 id={heading} className="text-lead font-bold">
          {freezer.name}
        </h2>
        <FreezerTag freezer={freezer} standing={standing} now={now} />
      </div>
      <FreezerSeen freezer={freezer} found={found} now={now} />
      <FreezerLink freezer={freezer} />
    </article>
  );
}

/** The producer's people go on to what the store is not asked to care for. */
function FreezerLink({ freezer: { id, name } }: { freezer: Freezer }) {
  const { t } = useTranslation('store');
  const { producer, side } = useMembership();
  if (side !== 'producer') return null;
  return (
    <Link
      to={paths.freezer(producer.slug, id)}
      aria-label={t('freezer.page-of', { freezer: name })}
      className="mt-1 -mb-2 inline-flex min-h-11 items-center text-small text-ink-2 underline decoration-edge underline-offset-4 hover:decoration-ink"
    >
      {t('freezer.page')}
    </Link>
  );
}
