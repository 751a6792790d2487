import type { Ref } from 'react';
import { SearchBox } from './search-box';
import type { Filters } from './use-filters';

interface Props {
  label: string;
  hint: string;
  filters: Filters;
  inputRef?: Ref<HTMLInputElement>;
}

/** The words a list is searched for. */
export const FilterSearch = ({ filters, ...box }: Props) => <SearchBox {...box} value={filters.get('q')} onSearch={(words) => filters.set('q', words)} />;
