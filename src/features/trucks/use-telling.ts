import { useState } from 'react';
import type { BodyInput, Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { call } from '../../api/call';
import { useTyped } from '../../form/typed';
import { useMembership } from '../../lib/me';
import { learn, settle, type Drafts } from './truck-drafts';

type Trucks = BodyInput<typeof api.trucks.set>['trucks'];

export interface Outcome {
  told: number;
  refused: number;
}

/** The drafts and their sending: what is told is gone from them, what is refused stays with its reason. */
export function useTelling(onRefused: (storeIds: string[]) => void) {
  const { slug } = useMembership().producer;
  const [drafts, setDrafts] = useState<Drafts>(new Map());
  const [outcome, setOutcome] = useState<Outcome | null>(null);
  const act = useAct(api.trucks.set, [api.trucks.list, api.stores.list, api.stores.read, api.freezers.list, api.freezers.digest]);
  useTyped(drafts.size > 0);

  const change = (next: (drafts: Drafts) => Drafts) => {
    setOutcome(null);
    setDrafts(next);
  };
  const tell = (trucks: Trucks) => {
    setOutcome(null);
    act.mutate({ params: { producer: slug }, body: { trucks } }, { onSuccess: told });
  };
  const told = (result: Result<typeof api.trucks.set>) => {
    setDrafts((now) => settle(now, result));
    setOutcome({ told: result.set.length, refused: result.refused.length });
    onRefused(result.refused.map(({ storeId }) => storeId));
    for (const { storeId, problem } of result.refused) if (problem === 'truck-changed') void askAnew(storeId);
  };
  // What is set by now, though the row may be on no page that is shown. Without an answer the next telling is refused again.
  const askAnew = (storeId: string) =>
    call(api.stores.read, { params: { producer: slug, storeId } }).then(
      ({ nextTruck }) => setDrafts((now) => learn(now, storeId, nextTruck)),
      () => undefined,
    );

  return { drafts, change, tell, outcome, problem: act.error, pending: act.isPending };
}

export type Telling = ReturnType<typeof useTelling>;
