import { useTranslation } from 'react-i18next';
import { row } from '../../../server/contract/ability';
import type { FreezerPage } from '../../../server/contract/freezers';
import { comingTruck } from '../../../server/domain/fleet-standing';
import { freshnessOf } from '../../../server/domain/freshness';
import { useFormat } from '../../lib/format';
import { useAbility, useMembership } from '../../lib/me';
import { DefinitionList } from '../../ui/definition-list';
import { truckWords } from '../stores/truck-words';
import { Clocks } from './clocks';

interface Props {
  found: FreezerPage;
  now: number;
}

/** The truck, the sensor and the air. */
export function BesideFacts({ found: { freezer, store, nextTruck }, now }: Props) {
  const { t } = useTranslation('freezers');
  const format = useFormat(useMembership().producer.timeZone);
  const { state, sensor } = freezer;
  const airKnown = state && state.airF !== null && state.airAt !== null && freshnessOf(state.airAt, now) !== 'unusable';
  const readsTrucks = useAbility().can('read', row('NextTruck', { storeId: store.id }));
  const coming = comingTruck(nextTruck, now);
  const truck = coming ? (
    <Clocks zone={store.timeZone} now={now} say={(words) => truckWords(coming, words, now)} />
  ) : nextTruck ? (
    t('truck.past', { window: truckWords(nextTruck, format, now) })
  ) : (
    t('truck.none')
  );
  const items = [
    ...(readsTrucks ? [{ term: t('columns.truck'), detail: truck }] : []),
    { term: t('columns.air'), detail: airKnown && state.airF !== null ? format.degrees(state.airF) : t('unknown') },
    { term: t('columns.serial'), detail: sensor ? sensor.serial : t('standing.unfitted') },
    ...(sensor && state ? [{ term: t('columns.heard'), detail: format.ago(state.at, now) }] : []),
    { term: t('columns.asset'), detail: freezer.assetNumber },
    { term: t('beside.account'), detail: store.account },
  ];
  return (
    <div className="mt-4 border-t border-rule">
      <DefinitionList items={items} />
    </div>
  );
}
