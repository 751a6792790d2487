import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { Account } from '../../../server/contract/accounts';
import { api } from '../../../server/contract/index';
import { page } from '../../api/page';
import { queryClient } from '../../api/query';
import type { NamedField } from '../../form/changed-meanwhile';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership, useMust } from '../../lib/me';
import { paths } from '../../paths';
import { AccountFields } from './account-fields';
import { AccountFrame } from './account-frame';
import { accountQuery, accountQueryOf, accountStale } from './account-query';
import type { Done } from './done';
import { enteredOf, type Entered } from './entered';

export const changeAccountPage = page({
  words: ['accounts', 'validation'],
  queries: (place) => ({ account: accountQuery(place) }),
  View: ChangeAccount,
});

function ChangeAccount({ account }: { account: Account }) {
  useMust('update', 'Account');
  const { t } = useTranslation('accounts');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const there = paths.account(slug, account.id);
  const form = useContractForm(api.accounts.change, {
    start: enteredOf(account),
    input: (body) => ({ params: { producer: slug, accountId: account.id }, body }),
    stale: accountStale,
    onDone: () => void navigate(there, { state: { act: 'changed' } satisfies Done }),
  });
  const newest = async () => enteredOf(await queryClient.fetchQuery({ ...accountQueryOf(slug, account.id), staleTime: 0 }));
  return (
    <AccountFrame title={t('change.title', { name: account.name })} back={{ to: there, name: account.name }}>
      <Form form={form} meanwhile={{ fields: useAccountFields(), onNewest: newest }}>
        <AccountFields />
        <SubmitButton>{t('save')}</SubmitButton>
      </Form>
    </AccountFrame>
  );
}

/** The fields by the names people see, for saying what somebody else changed. */
function useAccountFields(): NamedField<Entered>[] {
  const { t } = useTranslation(['accounts', 'common']);
  return [
    { name: 'number', label: t('number'), said: ({ number }) => number },
    { name: 'name', label: t('name'), said: ({ name }) => name },
    { name: 'terms', label: t('terms'), said: ({ terms }) => terms || t('none-said') },
    { name: 'language', label: t('common:language.label'), said: ({ language }) => t(`common:language.${language}`) },
    { name: 'contacts', label: t('contacts.title') },
  ];
}
