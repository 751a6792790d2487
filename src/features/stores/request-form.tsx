import { useEffect, type ReactNode } from 'react';
import type { BodyInput } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { q, queryClient } from '../../api/query';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { useDraftWords } from './draft-words';

interface Props {
  start: Omit<BodyInput<typeof api.requests.file>, 'words'>;
  label: string;
  hint: string;
  send: string;
  onFiled: (requestId: string) => void;
  children?: ReactNode;
}

/** Files a request with optional words; what was typed survives a reload of the page, so nothing needs guarding. */
export function RequestForm({ start, label, hint, send, onFiled, children }: Props) {
  const producer = useMembership().producer.slug;
  const { kept, keep, forget } = useDraftWords(`${start.storeId}.${start.kind === 'ice-sooner' ? 'ice' : 'report'}`);
  const form = useContractForm(api.requests.file, {
    start: { ...start, words: kept },
    input: (body) => ({ params: { producer }, body }),
    stale: [api.stores.read, api.stores.list, api.requests.list],
    guarded: false,
    onDone: (request) => {
      forget();
      queryClient.setQueryData(q(api.requests.read, { params: { producer, requestId: request.id } }).queryKey, request);
      onFiled(request.id);
    },
  });
  const { subscribe } = form.fields;
  useEffect(() => subscribe({ formState: { values: true }, callback: ({ values }) => keep(values.words ?? '') }), [subscribe, keep]);

  return (
    <div className="mt-4">
      <Form form={form}>
        <TextField name="words" label={label} hint={hint} lines={4} />
        {children}
        <SubmitButton wide>{send}</SubmitButton>
      </Form>
    </div>
  );
}
