import { useFormContext, type RegisterOptions } from 'react-hook-form';
import { useFaultWords } from './use-fault-words';

/** A field of the form around, by its name in the body. `none` is what the body gets for an empty control. */
export function useField(name: string, none?: { value: null | undefined }) {
  const say = useFaultWords();
  const { register, getFieldState, formState } = useFormContext();
  const options: RegisterOptions = none ? { setValueAs: (value: unknown) => (value === '' ? none.value : value) } : {};
  const { error } = getFieldState(name, formState);
  return { bound: register(name, options), fault: error ? say(error.message) : undefined };
}
