import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import { useFormat } from '../../lib/format';
import { isLow } from './lane-low';

interface Props {
  freezer: Freezer;
  state: NonNullable<Freezer['state']>;
}

/** Not by its colour alone. */
const hatched = 'bg-[repeating-linear-gradient(135deg,var(--ember)_0_4px,var(--ember-tint)_4px_6px)]';

/** How many bags of each size, against a full lane. */
export function FreezerLanes({ freezer, state }: Props) {
  const { t } = useTranslation('store');
  const format = useFormat();
  return (
    <ul aria-label={t('freezer.lanes')} className="grid grid-cols-[auto_minmax(0,1fr)_auto] gap-x-3 gap-y-2">
      {state.level.lanes.map(({ bags, about, pounds, capacityPounds }, i) => {
        const lane = freezer.lanes[i];
        const share = capacityPounds > 0 ? Math.min(1, pounds / capacityPounds) : 0;
        const low = isLow({ pounds, capacityPounds });
        return (
          <li key={lane?.productId ?? i} className="col-span-3 grid grid-cols-subgrid items-center">
            <span>{format.pounds(lane?.bagPounds ?? 0)}</span>
            <span aria-hidden className="h-2 overflow-hidden rounded-full bg-sunk">
              <span className={`block h-full rounded-full ${low ? hatched : 'bg-fjord-2'}`} style={{ width: `${share * 100}%` }} />
            </span>
            <span className="text-right">
              {low && <span className="mr-1.5 font-semibold text-ember">{t(bags === 0 ? 'freezer.empty' : 'freezer.low')}</span>}
              {t(about ? 'freezer.bags-about' : 'freezer.bags', { count: bags, bags: format.number(bags) })}
            </span>
          </li>
        );
      })}
    </ul>
  );
}
