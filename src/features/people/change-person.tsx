import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { page } from '../../api/page';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Notice } from '../../ui/notice';
import { Deactivate } from './deactivate';
import type { Done } from './done';
import { memberQuery } from './member-query';
import { PersonActs } from './person-acts';
import { PersonFrame } from './person-frame';
import { placesQuery, type Places } from './places-query';
import { RoleFields } from './role-fields';
import { isScoped } from './scoped';

export const changePersonPage = page({
  words: ['people', 'validation'],
  queries: (place) => ({ member: memberQuery(place), places: placesQuery(place) }),
  View: ChangePerson,
});

interface Props {
  member: MemberOf;
  places: Places;
}

/** Another role for somebody, other stores, or no access any more. */
function ChangePerson({ member, places }: Props) {
  const { t } = useTranslation('people');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const [done, setDone] = useState<string | null>(null);
  const [leaving, setLeaving] = useState(false);
  const form = useContractForm(api.people.change, {
    start: { side: member.side, scopes: member.scopes.map(({ kind, id }) => ({ kind, id })) },
    input: ({ role = member.role, side, ...body }) => ({
      params: { producer: slug, memberId: member.id },
      body: { ...body, role, side: role === 'district-rep' ? side : undefined, scopes: isScoped(role) ? body.scopes : [] },
    }),
    // Whoever changes themselves sees other pages from then on.
    stale: [api.people.list, api.requests.assignees, api.me.read],
    onDone: ({ name }) => void navigate(paths.people(slug), { state: { act: 'changed', name } satisfies Done }),
  });
  return (
    <PersonFrame title={member.name} lead={member.email}>
      <Form form={form}>
        <RoleFields places={places} now={member} />
        <SubmitButton>{t('change.save')}</SubmitButton>
      </Form>
      <section aria-label={t('acts')} className="mt-8 border-t border-rule pt-5">
        <PersonActs member={member} onDone={setDone} onLeave={() => setLeaving(true)} />
        <div role="status" className="mt-4 empty:hidden">
          {done && <Notice tone="good" title={done} />}
        </div>
      </section>
      <Deactivate member={leaving ? member : null} onClose={() => setLeaving(false)} onDone={setDone} />
    </PersonFrame>
  );
}
