import { Field } from '../ui/field';
import { TextInput } from '../ui/text-input';
import { useField } from './use-field';

interface Props {
  name: string;
  label: string;
  hint?: string;
  /** Without a fraction; only the device's keyboard follows it, the body's schema decides. */
  whole?: boolean;
}

/** A number typed as text, so that no wheel or arrow changes it; an empty one is no number. */
export function NumberField({ name, label, hint, whole = false }: Props) {
  const { bound, fault } = useField(name, { value: undefined, number: true });
  return (
    <Field label={label} hint={hint} error={fault}>
      {(control) => <TextInput {...bound} {...control} inputMode={whole ? 'numeric' : 'decimal'} autoComplete="off" maxLength={12} />}
    </Field>
  );
}
