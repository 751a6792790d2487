import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { truckToCome } from '../../../server/domain/answers';
import { standingOf, type Standing } from '../../../server/domain/freezer-standing';
import { freshnessOf } from '../../../server/domain/freshness';
import { FreezerDrawings } from './freezer-drawings';
import { FreezerLanes } from './freezer-lanes';
import { FreezerRunOuts } from './freezer-run-outs';
import { FreezerSure } from './freezer-sure';
import { FreezerTag } from './freezer-tag';
import { FreezerUnseen } from './freezer-unseen';
import { knownOf } from './store-known';
import { useStoreWords } from './use-store-words';

interface Props {
  freezer: Freezer;
  found: StorePage;
  now: number;
}

/** One freezer: its name, how it stands, the two drawings, its bags, and how sure all that is. */
export function FreezerCard({ freezer, found, now }: Props) {
  const standing = standingOf(freezer, truckToCome(knownOf(found)), now, found.store.timeZone);
  const heading = `freezer-${freezer.id}`;
  return (
    <article aria-labelledby={heading} className="rounded-card border border-rule bg-surface px-4 py-4 sm:px-5">
      <div className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1.5">
        <h2 id={heading} className="text-lead font-bold">
          {freezer.name}
        </h2>
        <FreezerTag freezer={freezer} standing={standing} now={now} />
      </div>
      {freezer.sensor && freezer.state ? (
        <Seen freezer={freezer} state={freezer.state} standing={standing} found={found} now={now} />
      ) : (
        <FreezerUnseen freezer={freezer} found={found} now={now} />
      )}
    </article>
  );
}

interface SeenProps extends Props {
  state: NonNullable<Freezer['state']>;
  standing: Standing;
}

function Seen({ freezer, state, standing, found, now }: SeenProps) {
  const zone = found.store.timeZone;
  const believed = standing.kind !== 'silent';
  return (
    <>
      <Age at={state.at} zone={zone} now={now} />
      <FreezerDrawings freezer={freezer} state={state} found={found} now={now}>
        {believed && <FreezerLanes freezer={freezer} state={state} />}
        {believed && <FreezerRunOuts freezer={freezer} state={state} zone={zone} now={now} />}
        <FreezerSure freezer={freezer} state={state} zone={zone} now={now} />
      </FreezerDrawings>
    </>
  );
}

/** Old data says how old it is. */
function Age({ at, zone, now }: { at: number; zone: string; now: number }) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const freshness = freshnessOf(at, now);
  if (freshness === 'fresh') return null;
  return (
    <p className="mt-1 text-base font-semibold text-straw">
      {freshness === 'unusable' ? t('freezer.unusable', { when: say.when(at) }) : t('freezer.old', { ago: say.ago(at) })}
    </p>
  );
}
