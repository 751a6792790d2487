import { useTranslation } from 'react-i18next';
import { useLocation, useNavigate, useSearchParams } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { PageTitle } from '../../layouts/page-title';
import { CheckMail } from './check-mail';
import { safeNext } from './safe-next';

/** Asks for the address, then shows the same whatever the address is. What was asked survives a reload in the history. */
export function SignIn() {
  const { t } = useTranslation('sign-in');
  const [search] = useSearchParams();
  const next = safeNext(search.get('next'));
  const asked = askedOf(useLocation().state);
  return (
    <>
      <PageTitle title={asked ? t('check.title') : t('title')} />
      {asked ? <CheckMail email={asked} next={next} /> : <Ask next={next} />}
    </>
  );
}

function Ask({ next }: { next: string | null }) {
  const { t } = useTranslation('sign-in');
  const navigate = useNavigate();
  const form = useContractForm(api.auth.requestLink, {
    start: { email: '' },
    input: (body) => ({ body: { ...body, next: next ?? undefined } }),
    stale: [],
    guarded: false,
    onDone: (_, { email }) => void navigate(location.pathname + location.search, { state: { email } }),
  });
  return (
    <>
      <h1 className="text-title font-bold">{t('title')}</h1>
      <p className="mt-2 mb-6 text-ink-2">{t('lead')}</p>
      <Form form={form}>
        <TextField name="email" label={t('email')} type="email" autoComplete="email" inputMode="email" autoFocus />
        <SubmitButton wide>{t('ask')}</SubmitButton>
      </Form>
    </>
  );
}

const askedOf = (state: unknown): string | null =>
  typeof state === 'object' && state !== null && 'email' in state && typeof state.email === 'string' ? state.email : null;
