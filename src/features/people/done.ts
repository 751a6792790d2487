const acts = ['invited', 'changed'] as const;

export interface Done {
  act: (typeof acts)[number];
  name: string;
}

/** What a form did before it led back to the list, from the history entry, which may hold anything. */
export function doneOf(state: unknown): Done | null {
  if (typeof state !== 'object' || state === null || !('act' in state) || !('name' in state)) return null;
  const act = acts.find((known) => known === state.act);
  return act && typeof state.name === 'string' ? { act, name: state.name } : null;
}
