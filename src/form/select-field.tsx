import { Select } from '../ui/select';
import { FieldFrame } from './field-frame';
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
  const { id, control, fault } = useField(name, none);
  return (
    <FieldFrame id={id} label={label} hint={hint} fault={fault}>
      {(described) => (
        <Select {...control} {...described}>
          <option value="">{empty}</option>
          {options.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </Select>
      )}
    </FieldFrame>
  );
}
