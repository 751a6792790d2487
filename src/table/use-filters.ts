import { useSearchParams } from 'react-router-dom';

export interface Filters {
  get: (name: string) => string;
  /** An empty value takes the filter away; any change goes back to the first page. */
  set: (name: string, value: string) => void;
  clear: () => void;
  any: boolean;
}

/** A list's filters live in the URL, so that every list can be reached by a link. */
export function useFilters(): Filters {
  const [search, setSearch] = useSearchParams();
  const set = (name: string, value: string) =>
    setSearch(
      (now) => {
        now.delete('after');
        if (value) now.set(name, value);
        else now.delete(name);
        return now;
      },
      { replace: true, state: { keepFocus: true } },
    );
  return {
    get: (name) => search.get(name) ?? '',
    set,
    clear: () => setSearch({}, { replace: true, state: { keepFocus: true } }),
    any: [...search.keys()].some((name) => name !== 'after'),
  };
}
