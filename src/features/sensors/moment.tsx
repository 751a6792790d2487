import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';

interface Props {
  at: number | null;
  now: number;
}

/** When, in the producer's time zone, and how long ago. */
export function Moment({ at, now }: Props) {
  const { t } = useTranslation('sensors');
  const format = useFormat(useMembership().producer.timeZone);
  if (at === null) return <span className="text-ink-3">{t('never')}</span>;
  return (
    <>
      <span className="block">{format.when(at)}</span>
      <span className="block text-small text-ink-3">{format.ago(at, now)}</span>
    </>
  );
}
