import { Button } from '../ui/button';
import { EmptyState } from '../ui/states';
import type { Filters } from './use-filters';

interface Props {
  title: string;
  words: string;
  /** Of the button that takes the filters away. */
  clear: string;
  filters: Filters;
}

/** Where the filters let nothing through. */
export const NothingFound = ({ title, words, clear, filters }: Props) => (
  <EmptyState
    title={title}
    action={
      <Button variant="quiet" onClick={filters.clear}>
        {clear}
      </Button>
    }
  >
    {words}
  </EmptyState>
);
