import { Field } from '../ui/field';
import { Select } from '../ui/select';
import { useField } from './use-field';

interface Props {
  name: string;
  label: string;
  hint?: string;
  options: { value: string; label: string }[];
  /** The words of the choice that chooses nothing, and what the body then gets. */
  empty: string;
  none: { value: null | undefined };
}

/** One of a few. */
export function SelectField({ name, label, hint, options, empty, none }: Props) {
  const { bound, fault } = useField(name, none);
  return (
    <Field label={label} hint={hint} error={fault}>
      {(control) => (
        <Select {...bound} {...control}>
          <option value="">{empty}</option>
          {options.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}
