import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';
import { HolidaysField } from './holidays-field';
import { PartForm, type PartProps } from './part-form';

/** The days on which the service desk does not answer. */
export function HolidaysForm(props: PartProps) {
  const { t } = useTranslation('settings');
  const format = useFormat();
  return (
    <PartForm
      {...props}
      part={({ holidays }) => ({ holidays })}
      fields={[
        {
          name: 'holidays',
          label: t('holidays.title'),
          said: ({ holidays }) => holidays.map(({ day, name }) => [format.day(day), name].filter(Boolean).join(' ')).join(', ') || t('holidays.none'),
        },
      ]}
    >
      <HolidaysField />
    </PartForm>
  );
}
