import { useTranslation } from 'react-i18next';
import type { TruckRow } from '../../../server/contract/trucks';
import { useStoreWords } from '../stores/use-store-words';

interface Props {
  row: TruckRow;
  now: number;
}

/** When the first of a store's freezers is likely empty. */
export function RunOutCell({ row: { store, runOutLikely }, now }: Props) {
  const { t } = useTranslation('trucks');
  const say = useStoreWords(store.timeZone, now);
  if (runOutLikely === null) return <span className="text-ink-3">{t('no-run-out')}</span>;
  return <span className="block first-letter:uppercase">{runOutLikely <= now ? t('empty-now') : say.partOfDay(runOutLikely)}</span>;
}
