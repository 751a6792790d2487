import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import { languages } from '../../../server/contract/words';
import { page } from '../../api/page';
import { Form } from '../../form/form';
import { SelectField } from '../../form/select-field';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import type { Done } from './done';
import { grantedTo } from './grants';
import { PersonFrame } from './person-frame';
import { placesQuery, type Places } from './places-query';
import { RoleFields } from './role-fields';
import { isScoped } from './scoped';

export const invitePage = page({
  words: ['people', 'validation'],
  queries: (place) => ({ places: placesQuery(place) }),
  View: Invite,
});

/** Gives somebody a role and writes to them. */
function Invite({ places }: { places: Places }) {
  const { t } = useTranslation(['people', 'common']);
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const form = useContractForm(api.people.invite, {
    start: { email: '', name: '', side: 'producer', scopes: [], grants: [] },
    input: (body) => ({ params: { producer: slug }, body: { ...body, scopes: isScoped(body.role) ? body.scopes : [], grants: grantedTo(body.role, body.grants) } }),
    stale: [api.people.list, api.requests.assignees],
    onDone: ({ name }) => void navigate(paths.people(slug), { state: { act: 'invited', name } satisfies Done }),
  });
  return (
    <PersonFrame title={t('invite.title')} lead={t('invite.lead')}>
      <Form form={form}>
        <TextField name="email" type="email" label={t('email')} autoComplete="off" maxLength={254} />
        <TextField name="name" label={t('name')} autoComplete="off" maxLength={120} />
        <SelectField
          name="language"
          label={t('common:language.label')}
          hint={t('invite.language-hint')}
          options={languages.map((value) => ({ value, label: t(`common:language.${value}`) }))}
          empty={t('choose')}
          none={{ value: undefined }}
        />
        <RoleFields places={places} />
        <SubmitButton>{t('invite.send')}</SubmitButton>
      </Form>
    </PersonFrame>
  );
}
