import { useTranslation } from 'react-i18next';
import { dayOf, hourOf } from '../../../server/domain/civil';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { spansText } from '../../lib/spans';
import { zoneName } from '../../lib/zones';
import { useNow } from '../stores/use-now';

/** When the producer's service desk answers, for those who wait for it; nothing where it has not said so. */
export function DeskHours() {
  const { t } = useTranslation('requests');
  const { timeZone, serviceHours, holidays } = useMembership().producer;
  const here = useFormat();
  const now = useNow();
  const today = holidays.find(({ day }) => day === dayOf(now, timeZone));
  if (serviceHours.length === 0 && !today) return null;
  // Only where clocks on the wall say something else.
  const elsewhere = hourOf(now, timeZone) !== hourOf(now, here.timeZone);
  const hours = spansText(serviceHours, here.locale);
  return (
    <p className="text-body text-ink-2">
      {today && <span className="block font-semibold">{today.name ? t('desk.holiday', { name: today.name }) : t('desk.closed')}</span>}
      {hours && (elsewhere ? t('desk.hours-there', { hours, zone: zoneName(timeZone, here.locale) }) : t('desk.hours', { hours }))}
    </p>
  );
}
