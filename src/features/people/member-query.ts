import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { call, Problem } from '../../api/call';
import type { Place } from '../../api/page';

/** One person, looked for page by page; stale with every answer of the list. */
export const memberQuery = ({ params: { producer = '', memberId = '' } }: Place) =>
  queryOptions({
    queryKey: [api.people.list.id, { producer, memberId }] as const,
    queryFn: ({ signal }) => find(producer, memberId, signal),
  });

async function find(producer: string, memberId: string, signal: AbortSignal): Promise<MemberOf> {
  let after: string | undefined;
  do {
    const { people, next } = await call(api.people.list, { params: { producer }, query: { after, limit: '200' } }, signal);
    const member = people.find(({ id }) => id === memberId);
    if (member) return member;
    after = next ?? undefined;
  } while (after);
  throw new Problem('not-found', 404);
}
