import { requestKinds, type RequestKind } from '../../../server/contract/words';

/** What a store reports as wrong; asking for ice has its own page. */
export type ProblemKind = Exclude<RequestKind, 'ice-sooner'>;
export const problemKinds = requestKinds.filter((kind): kind is ProblemKind => kind !== 'ice-sooner');

/** In the URL's place of a freezer: about none of them in particular. */
export const noFreezer = 'none';

export type ReportStep =
  | { step: 'kind' }
  | { step: 'freezer'; kind: ProblemKind }
  | { step: 'details'; kind: ProblemKind; freezerId: string | null }
  | { step: 'filed'; requestId: string };

/**
 * Where a report stands, read from its address, so that a reload and the browser's way back keep every choice.
 * The freezer is not asked for where the store has only one, or none.
 */
export function reportStep(search: URLSearchParams, freezerIds: string[]): ReportStep {
  const filed = search.get('filed');
  if (filed) return { step: 'filed', requestId: filed };
  const kind = problemKinds.find((one) => one === search.get('kind'));
  if (!kind) return { step: 'kind' };
  if (freezerIds.length < 2) return { step: 'details', kind, freezerId: freezerIds[0] ?? null };
  const freezer = search.get('freezer');
  if (freezer === noFreezer) return { step: 'details', kind, freezerId: null };
  const known = freezerIds.find((id) => id === freezer);
  return known ? { step: 'details', kind, freezerId: known } : { step: 'freezer', kind };
}

/** The address with some of its answers changed; `null` takes one out. */
export function withAnswers(search: URLSearchParams, answers: Record<string, string | null>): string {
  const next = new URLSearchParams(search);
  for (const [name, value] of Object.entries(answers)) {
    if (value === null) next.delete(name);
    else next.set(name, value);
  }
  return `?${next}`;
}
