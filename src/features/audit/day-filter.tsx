import { useState } from 'react';
import type { Filters } from '../../table/use-filters';
import { TextInput } from '../../ui/text-input';

interface Props {
  label: string;
  name: string;
  filters: Filters;
}

/** A year being typed begins in the first century: only from here on is a day meant. */
const EARLIEST = '2000-01-01';
const LATEST = '9999-12-31';

/** A day that bounds a list; half-typed ones change nothing. */
export function DayFilter({ label, name, filters }: Props) {
  const value = filters.get(name);
  const [typed, setTyped] = useState(value);
  const [shown, setShown] = useState(value);
  // The URL may change from elsewhere: back, or the filters cleared.
  if (shown !== value) {
    setShown(value);
    setTyped(value);
  }
  return (
    <label className="block min-w-0 lg:w-44">
      <span className="mb-1 block text-small font-semibold text-ink-3">{label}</span>
      <TextInput
        type="date"
        min={EARLIEST}
        max={LATEST}
        value={typed}
        onChange={({ target }) => {
          setTyped(target.value);
          if (target.validity.valid) filters.set(name, target.value);
        }}
      />
    </label>
  );
}
