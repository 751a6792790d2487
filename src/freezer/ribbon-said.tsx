import { useTranslation } from 'react-i18next';
import type { Language } from '../../server/contract/words';
import { formatIn } from '../lib/format';
import { daysOf, spanOf, type ForecastPoint, type RibbonData } from './ribbon-data';

interface Props {
  data: RibbonData;
  locale: Language;
}

/** The ribbon for those who hear the page: what it says, then its points. */
export function RibbonSaid({ data, locale }: Props) {
  const { t } = useTranslation('freezer');
  const { percent, pounds, date, when, window, degrees } = formatIn({ locale, timeZone: data.timeZone });
  const { history, forecast, deliveries, truck, empty } = data;
  const shares = ({ likely, low, high }: ForecastPoint) => ({ likely: percent(likely), low: percent(low), high: percent(high) });
  const span = spanOf(data);
  const days = daysOf(span, data);
  const level = history.at(-1);
  const end = forecast.at(-1);

  const sentences = [
    level ? t('ribbon.said.level', { share: percent(level[1]) }) : t('ribbon.said.no-level'),
    truck ? t('ribbon.said.truck', { when: window(truck) }) : t('ribbon.said.no-truck'),
    empty && t('ribbon.said.empty', { from: when(empty.from), to: when(empty.to) }),
    end && t('ribbon.said.late', { when: date(end.at), ...shares(end) }),
  ];
  const points = [
    ...days.flatMap(({ start }, i) => {
      const next = days[i + 1]?.start ?? span.to;
      const last = history.findLast(([at]) => at >= start && at < next);
      return last ? [{ at: last[0], words: t('ribbon.points.past', { when: date(last[0]), share: percent(last[1]) }) }] : [];
    }),
    ...deliveries
      .filter(({ at }) => at >= span.from)
      .map((delivery) => ({
        at: delivery.at,
        words:
          delivery.pounds === undefined
            ? t('ribbon.points.delivery', { when: when(delivery.at) })
            : t('ribbon.points.delivery-pounds', { when: when(delivery.at), pounds: pounds(delivery.pounds) }),
      })),
    ...days.flatMap(({ middle }) => {
      const point = forecast.find(({ at }) => at >= middle);
      return point && middle > data.now ? [{ at: middle, words: t('ribbon.points.ahead', { when: date(middle), ...shares(point) }) }] : [];
    }),
    ...days.flatMap(({ middle, high }) =>
      high === null ? [] : [{ at: middle + 1, words: t('ribbon.points.high', { when: date(middle), high: degrees(high) }) }],
    ),
  ].sort((a, b) => a.at - b.at);
  return (
    <div className="sr-only">
      <p>{sentences.filter(Boolean).join(' ')}</p>
      <p>{t('ribbon.points.title')}</p>
      <ul>
        {points.map(({ at, words }) => (
          <li key={`${at} ${words}`}>{words}</li>
        ))}
      </ul>
    </div>
  );
}
