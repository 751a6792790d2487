import { useFormContext } from 'react-hook-form';
import { useFaultWords } from '../../form/use-fault-words';
import { Field } from '../../ui/field';
import { TextInput } from '../../ui/text-input';

interface Props {
  name: string;
  label: string;
}

/** A count of bags; nothing entered is none. */
export function BagsField({ name, label }: Props) {
  const say = useFaultWords();
  const { register, getFieldState, formState } = useFormContext();
  const { error } = getFieldState(name, formState);
  const bags = register(name, { setValueAs: (value: unknown) => (value === '' ? 0 : Number(value)) });
  return (
    <Field label={label} error={error ? say(error.message) : undefined}>
      {(control) => <TextInput {...bags} {...control} inputMode="numeric" onFocus={({ target }) => target.select()} />}
    </Field>
  );
}
