import { standardSchemaResolver } from '@hookform/resolvers/standard-schema';
import { useState } from 'react';
import { useForm, type DefaultValues, type FieldPath, type FieldValues, type Resolver, type UseFormReturn } from 'react-hook-form';
import type { Body, BodyInput, Endpoint, Result } from '../../server/contract/endpoint';
import { useAct } from '../api/act';
import type { Input, Problem } from '../api/call';
import { fieldOf } from './pointer';
import { useTyped } from './typed';

type WithBody = Endpoint & { body: NonNullable<Endpoint['body']> };
type Values<E> = BodyInput<E> extends FieldValues ? BodyInput<E> : never;
type Sent<E> = Body<E> extends FieldValues ? Body<E> : never;

interface Options<E extends WithBody> {
  start: DefaultValues<Values<E>>;
  /** Where the fields follow something that may change under the person's hand; what they touched stays. */
  values?: Values<E>;
  /** The whole question to the server around the checked body. */
  input: (body: Sent<E>) => Input<E>;
  /** Which answers the change makes stale. */
  stale: Endpoint[];
  onDone?: (result: Result<E>, sent: Sent<E>) => void;
  /** False for a form whose values are no loss, such as a search. */
  guarded?: boolean;
}

export interface ContractForm<V extends FieldValues, S extends FieldValues = FieldValues> {
  fields: UseFormReturn<V, unknown, S>;
  /** What the server refused, until the next try. */
  problem: Problem | null;
  pending: boolean;
  submit: () => Promise<void>;
}

/** A form of one endpoint: checked by the contract's body schema, sent once, its faults laid on its fields. */
export function useContractForm<const E extends WithBody>(endpoint: E, options: Options<E>): ContractForm<Values<E>, Sent<E>> {
  const act = useAct(endpoint, options.stale);
  const [problem, setProblem] = useState<Problem | null>(null);
  const fields = useForm<Values<E>, unknown, Sent<E>>({
    defaultValues: options.start,
    values: options.values,
    resetOptions: { keepDirtyValues: true },
    // The endpoint's types and its schema say the same; the resolver's generics cannot follow a conditional type.
    resolver: standardSchemaResolver(endpoint.body as Parameters<typeof standardSchemaResolver>[0]) as unknown as Resolver<Values<E>, unknown, Sent<E>>,
  });
  const typed = useTyped(fields.formState.isDirty && options.guarded !== false);

  const send = async (body: Sent<E>) => {
    setProblem(null);
    try {
      const result = await act.mutateAsync(options.input(body));
      typed.release();
      fields.reset(undefined, { keepDirtyValues: false });
      options.onDone?.(result, body);
    } catch (error) {
      refused(error as Problem);
    }
  };

  const refused = (refusal: Problem) => {
    setProblem(refusal);
    for (const { pointer, fault } of refusal.errors) {
      const name = fieldOf(pointer);
      if (name) fields.setError(name as FieldPath<Values<E>>, { type: 'server', message: fault });
    }
  };

  return { fields, problem, pending: act.isPending, submit: fields.handleSubmit(send) };
}
