import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';
import { storeWords } from './store-words';

export type StoreWords = ReturnType<typeof storeWords>;

/** How the store's days and numbers are said, in the person's language and the store's zone. */
export function useStoreWords(zone: string, now: number): StoreWords {
  const { t } = useTranslation('store');
  const format = useFormat(zone);
  return useMemo(() => storeWords(t, format, now), [t, format, now]);
}
