import { useFormContext, type RegisterOptions } from 'react-hook-form';
import { useFaultWords } from './use-fault-words';

/** What the body gets for what stands in a control. */
interface Reading {
  /** For an empty control. */
  value: null | undefined;
  number?: boolean;
}

/** A field of the form around, by its name in the body. Without a reading the body gets the text as it is. */
export function useField(name: string, reading?: Reading) {
  const say = useFaultWords();
  const { register, getFieldState, formState } = useFormContext();
  const options: RegisterOptions = reading ? { setValueAs: (text: unknown) => read(text, reading) } : {};
  const { error } = getFieldState(name, formState);
  return { bound: register(name, options), fault: error ? say(error.message) : undefined };
}

function read(text: unknown, { value, number }: Reading): unknown {
  if (text === '') return value;
  return number ? Number(text) : text;
}
