import type { Filters } from './use-filters';
import { Select } from '../ui/select';

interface Props {
  label: string;
  name: string;
  options: { value: string; label: string }[];
  filters: Filters;
}

/** One filter of a list; a value from a link that is no option is shown as the first. */
export function FilterSelect({ label, name, options, filters }: Props) {
  const value = filters.get(name);
  const known = options.some((option) => option.value === value);
  return (
    <label className="block min-w-0">
      <span className="mb-1 block text-small font-semibold text-ink-3">{label}</span>
      <Select value={known ? value : ''} onChange={(event) => filters.set(name, event.target.value)}>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </Select>
    </label>
  );
}
