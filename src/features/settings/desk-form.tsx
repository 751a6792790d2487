import { useTranslation } from 'react-i18next';
import { languages } from '../../../server/contract/words';
import { SpansField } from '../../form/spans-field';
import { spansText } from '../../lib/spans';
import { PartForm, type PartProps } from './part-form';

/** When the service desk answers; stores read it where they look for help. */
export function DeskForm(props: PartProps) {
  const { t, i18n } = useTranslation('settings');
  const locale = languages.find((language) => language === i18n.language) ?? 'en';
  return (
    <PartForm
      {...props}
      part={({ serviceHours }) => ({ serviceHours })}
      fields={[{ name: 'serviceHours', label: t('desk.hours'), said: ({ serviceHours }) => spansText(serviceHours, locale) || t('desk.none') }]}
    >
      <SpansField
        name="serviceHours"
        labels={{
          legend: t('desk.hours'),
          hint: t('desk.hint'),
          none: t('desk.none'),
          span: (n) => t('desk.span', { n }),
          remove: (n) => t('desk.remove', { n }),
          days: t('desk.days'),
          from: t('desk.from'),
          to: t('desk.to'),
          add: t('desk.add'),
        }}
      />
    </PartForm>
  );
}
