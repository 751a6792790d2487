import { useTranslation } from 'react-i18next';
import type { TruckRow } from '../../../server/contract/trucks';
import { dayOf } from '../../../server/domain/civil';
import { Tag } from '../../ui/tag';
import { useStoreWords } from '../stores/use-store-words';

interface Props {
  row: TruckRow;
  now: number;
}

/** The truck a store was told of; one that is past its window says so. */
export function NextTruckCell({ row: { store, truck }, now }: Props) {
  const { t } = useTranslation('trucks');
  const say = useStoreWords(store.timeZone, now);
  if (!truck) return <span className="text-ink-3">{t('no-truck')}</span>;
  if (truck.to >= now) return <span className="block first-letter:uppercase">{say.dayAndWindow(truck)}</span>;
  const when = truck.day === dayOf(now, store.timeZone) ? say.times(truck) : say.dayAndWindow(truck);
  return (
    <span className="grid justify-items-start gap-1">
      <Tag tone="rust" shape="diamond">
        {t('late')}
      </Tag>
      {t('was-due', { when })}
    </span>
  );
}
