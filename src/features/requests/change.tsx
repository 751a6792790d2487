import { useState } from 'react';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Request } from '../../../server/contract/requests';
import { nextSteps } from '../../../server/domain/request-steps';
import { invalidate, q } from '../../api/query';
import { Form } from '../../form/form';
import { SelectField } from '../../form/select-field';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { Button } from '../../ui/button';

/** Assign, move on, schedule. Holds on to the version the person began with, so two people cannot undo each other unseen. */
export function Change({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const queryClient = useQueryClient();
  const [seen, see] = useState(request);
  const [saved, setSaved] = useState(false);
  const [looked, setLooked] = useState(false);
  const params = { producer: producer.slug, requestId: request.id };
  const form = useContractForm(api.requests.change, {
    start: startOf(seen),
    values: startOf(seen),
    input: (body) => ({ params, body }),
    stale: [api.requests.read, api.requests.list, api.stores.read],
    onDone: (changed) => {
      see(changed);
      setSaved(true);
      setLooked(false);
    },
  });
  const { isDirty } = form.fields.formState;
  if (!isDirty && seen.version !== request.version) see(request);
  const state = form.fields.watch('state');
  const scheduled = (state ?? seen.state) === 'scheduled';
  const look = async () => {
    see(await queryClient.fetchQuery({ ...q(api.requests.read, { params }), staleTime: 0 }));
    setLooked(true);
    void invalidate(api.requests.list);
  };

  return (
    <section className="mb-6 border-b border-rule pb-6" aria-labelledby="change-title">
      <h2 id="change-title" className="mb-3 font-bold">
        {t('change.title')}
      </h2>
      <Form form={form} done={saved && !isDirty ? t('change.saved') : undefined}>
        {form.problem?.type === 'request-changed' && <WhatChanged now={seen} look={() => void look()} looked={looked} />}
        <AssigneeField request={seen} />
        <SelectField
          name="state"
          label={t('change.state')}
          empty={t('change.keep', { state: t(`states.${seen.state}`) })}
          none={{ value: undefined }}
          options={steps.filter((step) => nextSteps(seen.state).includes(step)).map((step) => ({ value: step, label: t(`states.${step}`) }))}
        />
        {scheduled && <TextField name="scheduledDay" type="date" label={t('change.day')} none={{ value: undefined }} />}
        <SubmitButton>{t('change.save')}</SubmitButton>
      </Form>
    </section>
  );
}

const steps = ['open', 'waiting-on-store', 'scheduled', 'solved', 'closed'] as const;

const startOf = ({ version, assignee, scheduledDay }: Request) => ({
  version,
  assigneeId: assignee?.id ?? null,
  scheduledDay: scheduledDay ?? undefined,
  state: undefined,
});

function AssigneeField({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const { data } = useQuery(q(api.requests.assignees, { params: { producer: producer.slug } }));
  const known = data?.assignees ?? [];
  const now = request.assignee;
  // Whoever has it stays to be seen, even after their role changed.
  const people = now && !known.some(({ id }) => id === now.id) ? [now, ...known] : known;
  return (
    <SelectField
      name="assigneeId"
      label={t('change.assignee')}
      empty={t('change.nobody')}
      none={{ value: null }}
      options={people.map(({ id, name }) => ({ value: id, label: name }))}
    />
  );
}

/** Somebody was faster: what was chosen here is kept, and what stands now is said. */
function WhatChanged({ now, look, looked }: { now: Request; look: () => void; looked: boolean }) {
  const { t } = useTranslation('requests');
  if (!looked) {
    return (
      <Button variant="quiet" onClick={look}>
        {t('change.see')}
      </Button>
    );
  }
  const assignee = now.assignee?.name ?? t('list.unassigned');
  return (
    <p role="status" className="text-ink-2">
      {t('change.now', { state: t(`states.${now.state}`), assignee })}
    </p>
  );
}
