import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useEnter } from './use-enter';

interface Props {
  /** Of the link, where it was opened in a browser that did not ask for it. */
  token?: string;
  next: string | null;
}

/** The six digits of the mail. */
export function CodeForm({ token, next }: Props) {
  const { t } = useTranslation('sign-in');
  const enter = useEnter(next);
  const form = useContractForm(api.auth.signIn, {
    start: { code: '' },
    input: (body) => ({ body: { ...body, token } }),
    stale: [],
    guarded: false,
    onDone: enter,
  });
  return (
    <Form form={form}>
      <TextField name="code" label={t('check.code')} inputMode="numeric" autoComplete="one-time-code" maxLength={9} />
      <SubmitButton wide>{t('check.enter')}</SubmitButton>
    </Form>
  );
}
