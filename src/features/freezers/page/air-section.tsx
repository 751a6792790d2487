import { lazy, Suspense } from 'react';
import { useTranslation } from 'react-i18next';
import { WARM_ABOVE_F } from '../../../../server/domain/cooling';
import { useFormat } from '../../../lib/format';
import { Skeleton } from '../../../ui/skeleton';
import { airDays, type Air } from './air-data';

// The charts come after the page.
const AirChart = lazy(() => import('./air-chart'));

interface Props {
  air: Air;
  zone: string;
  now: number;
}

/** How cold it was in the last days, drawn and said. */
export function AirSection({ air, zone, now }: Props) {
  const { t } = useTranslation('freezer-page');
  const { degrees } = useFormat();
  const values = air.map(([, value]) => value);
  return (
    <section aria-labelledby="air" className="rounded-card border border-rule bg-surface px-4 py-4 sm:px-5">
      <h2 id="air" className="text-lead font-bold">
        {t('air.title')}
      </h2>
      {air.length === 0 ? (
        <p className="mt-1 text-ink-2">{t('air.none')}</p>
      ) : (
        <>
          <p className="mt-1 text-ink-2">
            {t('air.between', { low: degrees(Math.min(...values)), high: degrees(Math.max(...values)) })}{' '}
            {t(Math.max(...values) > WARM_ABOVE_F ? 'air.above' : 'air.below', { mark: degrees(WARM_ABOVE_F) })}
          </p>
          <Suspense fallback={<Skeleton className="mt-2 h-44" />}>
            <AirChart air={air} zone={zone} now={now} mark={WARM_ABOVE_F} />
          </Suspense>
          <AirByDay air={air} zone={zone} />
        </>
      )}
    </section>
  );
}

/** The line for those who hear the page. */
function AirByDay({ air, zone }: Pick<Props, 'air' | 'zone'>) {
  const { t } = useTranslation('freezer-page');
  const format = useFormat(zone);
  return (
    <ul aria-label={t('air.by-day')} className="sr-only">
      {airDays(air, zone).map(({ middle, low, high }) => (
        <li key={middle}>{t('air.day', { day: format.date(middle), low: format.degrees(low), high: format.degrees(high) })}</li>
      ))}
    </ul>
  );
}
