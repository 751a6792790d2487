import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';

/** The name others see beside this person's words. */
export function NameForm({ name }: { name: string }) {
  const { t } = useTranslation('profile');
  const [saved, setSaved] = useState(false);
  const form = useContractForm(api.me.update, {
    start: { name },
    values: { name },
    input: (body) => ({ body }),
    stale: [api.me.read],
    onDone: () => setSaved(true),
  });
  return (
    <Form form={form} done={saved ? t('saved') : undefined} className="max-w-sm">
      <TextField name="name" label={t('name')} autoComplete="name" maxLength={120} />
      <SubmitButton>{t('save-name')}</SubmitButton>
    </Form>
  );
}
