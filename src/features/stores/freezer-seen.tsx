import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { freshnessOf } from '../../../server/domain/freshness';
import { FreezerDrawings } from './freezer-drawings';
import { FreezerLanes } from './freezer-lanes';
import { FreezerRunOuts } from './freezer-run-outs';
import { FreezerSure } from './freezer-sure';
import { FreezerUnseen } from './freezer-unseen';
import { useStoreWords } from './use-store-words';

interface Props {
  freezer: Freezer;
  found: StorePage;
  now: number;
}

/** What is seen into one freezer: the two drawings, its bags, and how sure all that is; or what is known without a sensor. */
export function FreezerSeen({ freezer, found, now }: Props) {
  const { sensor, state } = freezer;
  if (!sensor || !state) return <FreezerUnseen freezer={freezer} found={found} now={now} />;
  const zone = found.store.timeZone;
  const believed = freshnessOf(state.at, now) !== 'unusable';
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
