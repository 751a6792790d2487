import { useId } from 'react';
import { useFormContext } from 'react-hook-form';
import { useFaultWords } from './use-fault-words';

/** What is wrong with a list as a whole, such as lanes that do not add up, and the id its group is described by. */
export function useListFault(name: string): { fault: string | undefined; faultId: string | undefined } {
  const id = useId();
  const say = useFaultWords();
  const { formState, getFieldState } = useFormContext();
  const { error } = getFieldState(name, formState);
  const message = error?.message ?? error?.root?.message;
  return message ? { fault: say(message), faultId: `${id}-error` } : { fault: undefined, faultId: undefined };
}
