const acts = ['created', 'changed'] as const;

export interface Done {
  act: (typeof acts)[number];
}

/** What a form did before it led to the account, from the history entry, which may hold anything. */
export function doneOf(state: unknown): Done['act'] | null {
  if (typeof state !== 'object' || state === null || !('act' in state)) return null;
  return acts.find((known) => known === state.act) ?? null;
}
