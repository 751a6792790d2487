import { useTranslation } from 'react-i18next';
import { TextField } from '../../form/text-field';
import { PartForm, type PartProps } from './part-form';

/** Who mail says it is from, and where answers go. */
export function MailForm(props: PartProps) {
  const { t } = useTranslation('settings');
  return (
    <PartForm
      {...props}
      part={({ mailSender }) => ({ mailSender })}
      fields={[
        {
          name: 'mailSender',
          label: t('mail.title'),
          said: ({ mailSender: { name, replyTo } }) => [name, replyTo].filter(Boolean).join(', ') || t('mail.own'),
        },
      ]}
    >
      <TextField name="mailSender.name" label={t('mail.name')} hint={t('mail.name-hint')} autoComplete="off" maxLength={80} />
      <TextField name="mailSender.replyTo" type="email" label={t('mail.reply-to')} hint={t('mail.reply-to-hint')} autoComplete="off" maxLength={254} />
    </PartForm>
  );
}
