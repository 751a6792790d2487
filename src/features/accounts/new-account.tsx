import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import { page } from '../../api/page';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { useContractForm } from '../../form/use-contract-form';
import { useFormat } from '../../lib/format';
import { useMembership, useMust } from '../../lib/me';
import { paths } from '../../paths';
import { AccountFields } from './account-fields';
import { AccountFrame } from './account-frame';
import { accountStale } from './account-query';
import type { Done } from './done';

export const newAccountPage = page({ words: ['accounts', 'validation'], queries: () => ({}), View: NewAccount });

function NewAccount() {
  useMust('create', 'Account');
  const { t } = useTranslation('accounts');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const { locale } = useFormat();
  const form = useContractForm(api.accounts.create, {
    start: { number: '', name: '', terms: '', language: locale, contacts: [] },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: accountStale,
    onDone: ({ id }) => void navigate(paths.account(slug, id), { state: { act: 'created' } satisfies Done }),
  });
  return (
    <AccountFrame title={t('new.title')} back={{ to: paths.accounts(slug), name: t('back') }}>
      <Form form={form}>
        <AccountFields />
        <SubmitButton>{t('new.yes')}</SubmitButton>
      </Form>
    </AccountFrame>
  );
}
