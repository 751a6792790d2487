import { useMutation } from '@tanstack/react-query';
import type { Endpoint, Result } from '../../server/contract/endpoint';
import { call, type Input, type Problem } from './call';
import { invalidate } from './query';

/** A change asked of the server; names which answers it makes stale. */
export const useAct = <const E extends Endpoint>(endpoint: E, stale: Endpoint[]) =>
  useMutation<Result<E>, Problem, Input<E>>({
    mutationFn: (input) => call(endpoint, input),
    onSuccess: () => invalidate(...stale),
  });
