import { useFormContext } from 'react-hook-form';
import { useFaultWords } from '../../../form/use-fault-words';
import { Field } from '../../../ui/field';
import { TextInput } from '../../../ui/text-input';

interface Props {
  name: 'latitude' | 'longitude';
  label: string;
}

/** Degrees as a number; what is no number stays in the box and is said to be none. */
export function CoordinateField({ name, label }: Props) {
  const say = useFaultWords();
  const { register, getFieldState, formState } = useFormContext();
  const { error } = getFieldState(name, formState);
  return (
    <Field label={label} error={error && say(error.message)}>
      {(control) => <TextInput {...register(name, { setValueAs: degreesOf })} {...control} inputMode="text" autoComplete="off" maxLength={24} />}
    </Field>
  );
}

/** A decimal comma is a comma to some. */
const degreesOf = (typed: unknown): unknown => {
  if (typeof typed !== 'string') return typed;
  return typed.trim() === '' ? undefined : Number(typed.trim().replace(',', '.'));
};
