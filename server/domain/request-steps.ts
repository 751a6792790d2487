export type RequestStep = 'new' | 'open' | 'waiting-on-store' | 'scheduled' | 'solved' | 'closed' | 'cancelled';

const steps: Record<RequestStep, RequestStep[]> = {
  new: ['open', 'waiting-on-store', 'scheduled', 'solved', 'closed', 'cancelled'],
  open: ['waiting-on-store', 'scheduled', 'solved', 'closed', 'cancelled'],
  'waiting-on-store': ['open', 'scheduled', 'solved', 'closed', 'cancelled'],
  scheduled: ['open', 'waiting-on-store', 'scheduled', 'solved', 'closed', 'cancelled'],
  solved: ['open', 'closed'],
  closed: [],
  cancelled: [],
};

/** Where a service request can go from here; `scheduled` again means another day. */
export const nextSteps = (from: RequestStep): RequestStep[] => steps[from];

/** Nothing more is said or done about it. */
export const hasEnded = (state: RequestStep): boolean => state === 'closed' || state === 'cancelled';

/** What a word from the store does: an answer that was waited for, or a repair that did not hold, opens it again. */
export const afterStoreReply = (state: RequestStep): RequestStep => (state === 'waiting-on-store' || state === 'solved' ? 'open' : state);
