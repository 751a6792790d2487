import { useTranslation } from 'react-i18next';
import { commonZones, otherZones, zoneName } from '../lib/zones';
import { SelectField } from './select-field';
import { withNow } from './with-now';

interface Props {
  hint: string;
  now?: string;
}

/** A time zone: those of the United States first, by the names people use. */
export function ZoneField({ hint, now }: Props) {
  const { t, i18n } = useTranslation();
  const options = [
    ...commonZones.map((value) => ({ value, label: t('zone.option', { name: zoneName(value, i18n.language), zone: value }) })),
    ...otherZones().map((value) => ({ value, label: value })),
  ];
  return (
    <SelectField
      name="timeZone"
      label={t('zone.label')}
      hint={hint}
      options={withNow(options, now, now ?? '')}
      empty={t('zone.choose')}
      none={{ value: undefined }}
    />
  );
}
