import { useSearchParams } from 'react-router-dom';

export interface Filters {
  get: (name: string) => string;
  /** An empty value takes the filter away; any change goes back to the first page. */
  set: (name: string, value: string) => void;
  clear: () => void;
  any: boolean;
}

/**
 * A list's filters live in the URL, so that every list can be reached by a link. `names` are given where the URL says
 * more than filters: only these are then counted and cleared.
 */
export function useFilters(names?: readonly string[]): Filters {
  const [search, setSearch] = useSearchParams();
  const filters = (names ?? [...search.keys()]).filter((name) => name !== 'after' && search.has(name));
  const change = (act: (now: URLSearchParams) => void) =>
    setSearch(
      (now) => {
        now.delete('after');
        act(now);
        return now;
      },
      { replace: true, state: { keepFocus: true } },
    );
  return {
    get: (name) => search.get(name) ?? '',
    set: (name, value) => change((now) => (value ? now.set(name, value) : now.delete(name))),
    clear: () => change((now) => filters.forEach((name) => now.delete(name))),
    any: filters.length > 0,
  };
}
