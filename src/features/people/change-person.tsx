import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { languages } from '../../../server/contract/words';
import { page } from '../../api/page';
import { Form } from '../../form/form';
import { SelectField } from '../../form/select-field';
import { SubmitButton } from '../../form/submit-button';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Notice } from '../../ui/notice';
import { Deactivate } from './deactivate';
import type { Done } from './done';
import { grantedTo } from './grants';
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

/** Another role for somebody, other stores, another language, or no access any more. */
function ChangePerson({ member, places }: Props) {
  const { t } = useTranslation(['people', 'common']);
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const [done, setDone] = useState<string | null>(null);
  const [leaving, setLeaving] = useState(false);
  const form = useContractForm(api.people.change, {
    start: { side: member.side, scopes: member.scopes.map(({ kind, id }) => ({ kind, id })), grants: member.grants },
    input: ({ role = member.role, side, grants = [], ...body }) => ({
      params: { producer: slug, memberId: member.id },
      body: {
        ...body,
        role,
        side: role === 'district-rep' ? side : undefined,
        scopes: isScoped(role) ? body.scopes : [],
        grants: grantedTo(role, grants),
      },
    }),
    // Whoever changes themselves sees other pages from then on.
    stale: [api.people.list, api.requests.assignees, api.me.read],
    onDone: ({ name }) => void navigate(paths.people(slug), { state: { act: 'changed', name } satisfies Done }),
  });
  return (
    <PersonFrame title={member.name} lead={member.email}>
      <Form form={form}>
        <RoleFields places={places} now={member} />
        <SelectField
          name="language"
          label={t('common:language.label')}
          hint={t('change.language-hint')}
          options={languages.filter((language) => language !== member.language).map((value) => ({ value, label: t(`common:language.${value}`) }))}
          empty={t('change.keep-language', { language: t(`common:language.${member.language}`) })}
          none={{ value: undefined }}
        />
        <SubmitButton>{t('change.save')}</SubmitButton>
      </Form>
      <section aria-label={t('acts')} className="mt-8 border-t border-rule pt-5">
        <PersonActs member={member} onDone={setDone} onLeave={() => setLeaving(true)} />
        <div role="status" className="mt-4 empty:hidden">
          {done && <Notice tone="good" title={done} />}
        </div>
      </section>
      {leaving && <Deactivate member={member} onClose={() => setLeaving(false)} onDone={setDone} />}
    </PersonFrame>
  );
}
