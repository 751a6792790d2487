import { useTranslation } from 'react-i18next';
import { languages } from '../../../server/contract/words';
import { SelectField } from '../../form/select-field';
import { TextField } from '../../form/text-field';
import { ContactFields } from './contact-fields';

/** What is entered of an account. */
export function AccountFields() {
  const { t } = useTranslation(['accounts', 'common']);
  return (
    <>
      <TextField name="number" label={t('number')} hint={t('number-hint')} maxLength={40} autoComplete="off" />
      <TextField name="name" label={t('name')} maxLength={120} autoComplete="off" />
      <TextField name="terms" label={t('terms')} hint={t('terms-hint')} maxLength={80} autoComplete="off" />
      <SelectField
        name="language"
        label={t('common:language.label')}
        hint={t('language-hint')}
        options={languages.map((value) => ({ value, label: t(`common:language.${value}`) }))}
        empty={t('choose')}
        none={{ value: undefined }}
      />
      <ContactFields />
    </>
  );
}
