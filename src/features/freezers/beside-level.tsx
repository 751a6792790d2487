import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import { freshnessOf } from '../../../server/domain/freshness';
import { useMembership } from '../../lib/me';
import { FreezerLanes } from '../stores/freezer-lanes';
import { FreezerRunOuts } from '../stores/freezer-run-outs';
import { FreezerSection } from '../stores/freezer-section';

interface Props {
  freezer: Freezer;
  now: number;
}

/** The front section, and the level and run-out of each lane. */
export function BesideLevel({ freezer, now }: Props) {
  const { t } = useTranslation('freezers');
  const zone = useMembership().producer.timeZone;
  const { sensor, state } = freezer;
  if (!sensor || !state) return <p className="my-3 text-ink-2">{t(sensor ? 'beside.waiting' : 'beside.unfitted')}</p>;
  return (
    <>
      <FreezerSection freezer={freezer} state={state} zone={zone} now={now} />
      {freshnessOf(state.at, now) === 'unusable' ? (
        <p className="mt-3 font-semibold text-straw">{t('beside.unusable')}</p>
      ) : (
        <div className="mt-4">
          <FreezerLanes freezer={freezer} state={state} />
          <FreezerRunOuts freezer={freezer} state={state} zone={zone} now={now} />
        </div>
      )}
    </>
  );
}
