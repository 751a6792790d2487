import { useSearchParams } from 'react-router-dom';
import { sortOf } from './measures';

/** The order of the rows lives in the URL; the page of the list stays. */
export function useSort() {
  const [search, setSearch] = useSearchParams();
  const setSort = (sort: string) =>
    setSearch(
      (now) => {
        now.set('sort', sort);
        return now;
      },
      { replace: true, state: { keepFocus: true }, preventScrollReset: true },
    );
  return { sort: sortOf(search.get('sort')), setSort };
}
