import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { MapStore } from '../../../../server/contract/fleet';
import { useMembership } from '../../../lib/me';
import { useNow } from '../../stores/use-now';
import { useStoreWords } from '../../stores/use-store-words';
import type { DrawnMark } from './drawn-stores';
import { useMarkKey } from './use-mark-key';

export interface StoreSaid {
  /** A store in words, and when it likely runs out. */
  store: (store: MapStore) => string;
  /** How it stands, in a word or two. */
  mark: (store: MapStore) => string;
  /** A mark of several. */
  together: (mark: DrawnMark) => string;
  /** No finer than a part of a day. */
  likely: (store: MapStore) => string;
}

/** Once for a map: its marks and rows say the same. */
export function useStoreSaid(): StoreSaid {
  const { t } = useTranslation('map');
  const keyOf = useMarkKey();
  const now = useNow();
  const { partOfDay, number } = useStoreWords(useMembership().producer.timeZone, now);
  return useMemo(() => {
    const whenOf = (at: number): string => (at <= now ? t('by-now') : partOfDay(at));
    const store = ({ name, city, mark, likely }: MapStore): string => {
      const state = t(`said.${keyOf(mark)}`);
      return likely === null ? t('named', { name, city, state }) : t('named-likely', { name, city, state, when: whenOf(likely) });
    };
    return {
      store,
      mark: ({ mark }) => t(`marks.${keyOf(mark)}`),
      together: ({ stores, worst }) => t('cluster', { count: stores.length, number: number(stores.length), worst: store(worst) }),
      likely: ({ mark, likely }) => (likely === null ? t(mark === 'silent' ? 'unknown' : 'none') : whenOf(likely)),
    };
  }, [t, keyOf, now, partOfDay, number]);
}
