import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import { useStoreWords } from './use-store-words';

interface Props {
  freezer: Freezer;
  state: NonNullable<Freezer['state']>;
  zone: string;
  now: number;
}

/** When each side that still has bags is empty without a truck, never finer than a part of the day. */
export function FreezerRunOuts({ freezer, state, zone, now }: Props) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const dated = state.laneRunOuts.flatMap(({ likely, late }, i) => (likely === null || likely <= now || state.level.lanes[i]?.bags === 0 ? [] : [{ likely, late, lane: freezer.lanes[i] }]));
  if (dated.length === 0) return null;
  return (
    <ul className="mt-3 grid gap-1 text-ink-2">
      {dated.map(({ likely, late, lane }) => {
        const place = lane && freezer.lanes.length > 1 ? t('freezer.place.side', { size: say.pounds(lane.bagPounds) }) : t('freezer.place.freezer');
        const words = { place, when: say.partOfDay(likely) };
        return (
          <li key={lane?.productId}>
            {late === null ? t('freezer.run-out', { ...words, context: 'likely' }) : t('freezer.run-out', { ...words, late: say.partOfDay(late) })}
          </li>
        );
      })}
    </ul>
  );
}
