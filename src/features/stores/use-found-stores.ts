import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { api } from '../../../server/contract/index';
import { q } from '../../api/query';
import { useMembership } from '../../lib/me';

/** The first stores with these words in their name or place. */
export function useFoundStores(words: string) {
  const { slug } = useMembership().producer;
  return useQuery({
    ...q(api.stores.list, { params: { producer: slug }, query: { q: words, limit: '10' } }),
    placeholderData: keepPreviousData,
  });
}
