import { Problem } from '../../api/call';

/** The one of this id in a list just asked for. */
export function newestOf<T extends { id: string }>(list: T[], id: string): T {
  const found = list.find((one) => one.id === id);
  if (!found) throw new Problem('not-found', 404);
  return found;
}
