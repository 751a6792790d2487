import { useQuery } from '@tanstack/react-query';
import { api } from '../../server/contract/index';
import { q } from '../api/query';

const EVERY = 60_000;

/** Whether one sees as somebody else; asked once a minute at most. */
export const seeingQuery = { ...q(api.auth.readSeeing, {}), staleTime: EVERY };

/** Seeing as somebody else one changes nothing, not even the language. */
export const useIsSeeing = (): boolean => Boolean(useQuery(seeingQuery).data?.seeing);
