import { useFormContext, useWatch } from 'react-hook-form';
import type { MemberOf } from '../../../server/contract/people';
import { useFaultWords } from '../../form/use-fault-words';

type Kind = MemberOf['scopes'][number]['kind'];

interface Values {
  scopes: { kind: Kind; id: string }[];
}

/** The assignments in the form around. */
export function useScopes() {
  const say = useFaultWords();
  const { setValue, getFieldState, formState } = useFormContext<Values>();
  const scopes = useWatch<Values, 'scopes'>({ name: 'scopes' });
  const { error } = getFieldState('scopes', formState);
  const toggle = (kind: Kind, id: string) => {
    const others = scopes.filter((scope) => scope.kind !== kind || scope.id !== id);
    setValue('scopes', others.length < scopes.length ? others : [...scopes, { kind, id }], { shouldDirty: true });
  };
  const chosen = (kind: Kind) => scopes.filter((scope) => scope.kind === kind).map(({ id }) => id);
  return { fault: error && say(error.message), chosen, toggle };
}
