import { useTranslation } from 'react-i18next';
import { ListsFrame, type ListOf } from '../../layouts/lists-frame';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';

/** Around the three lists about sensors. */
export function SensorsFrame(list: ListOf) {
  const { t } = useTranslation('sensors');
  const { slug } = useMembership().producer;
  const keys = useAbility().can('read', 'TelemetryKey');
  const lists = [
    { to: paths.sensors(slug), name: t('unclaimed.title') },
    { to: paths.quarantinedReadings(slug), name: t('readings.title') },
    ...(keys ? [{ to: paths.telemetryKeys(slug), name: t('keys.title') }] : []),
  ];
  return <ListsFrame heading={t('title')} label={t('lists')} lists={lists} {...list} />;
}
