import { useTranslation } from 'react-i18next';
import type { Language } from '../../server/contract/words';
import { formatIn, type Format } from '../lib/format';
import { daysOf, spanOf, type ForecastPoint, type RibbonData } from './ribbon-data';

interface Props {
  data: RibbonData;
  locale: Language;
}

/** The ribbon for those who hear the page: what it says, then its points in order. */
export function RibbonSaid({ data, locale }: Props) {
  const { t } = useTranslation('freezer');
  const format = formatIn({ locale, timeZone: data.timeZone });
  const points = usePoints(data, format);
  return (
    <div className="sr-only">
      <p>{useSentences(data, format).join(' ')}</p>
      <p>{t('ribbon.points.title')}</p>
      <ul>
        {points.map(({ at, words }) => (
          <li key={`${at} ${words}`}>{words}</li>
        ))}
      </ul>
    </div>
  );
}

function useSentences({ history, forecast, truck, empty }: RibbonData, format: Format): string[] {
  const { t } = useTranslation('freezer');
  const level = history.at(-1);
  const end = forecast.at(-1);
  return [
    level ? t('ribbon.said.level', { share: format.percent(level[1]) }) : t('ribbon.said.no-level'),
    ...(truck === undefined ? [] : [truck ? t('ribbon.said.truck', { when: format.window(truck) }) : t('ribbon.said.no-truck')]),
    ...(empty ? [t('ribbon.said.empty', { from: format.when(empty.from), to: format.when(empty.to) })] : []),
    ...(end ? [t('ribbon.said.end', { when: format.date(end.at), ...sharesOf(end, format) })] : []),
  ];
}

/** Each past day's last level, the deliveries, and noon of each day ahead. */
function usePoints(data: RibbonData, format: Format): { at: number; words: string }[] {
  const { t } = useTranslation('freezer');
  const span = spanOf(data);
  const days = daysOf(span, data);
  const past = days.flatMap(({ start }, i) => {
    const end = days[i + 1]?.start ?? span.to;
    const last = data.history.findLast(([at]) => at >= start && at < end);
    return last ? [{ at: last[0], words: t('ribbon.points.past', { when: format.date(last[0]), share: format.percent(last[1]) }) }] : [];
  });
  const deliveries = data.deliveries
    .filter(({ at }) => at >= span.from)
    .map(({ at, pounds }) => {
      const when = format.when(at);
      return { at, words: pounds === undefined ? t('ribbon.points.delivery', { when }) : t('ribbon.points.delivery-pounds', { when, pounds: format.pounds(pounds) }) };
    });
  const ahead = days.flatMap(({ middle }) => {
    const point = middle > data.now ? data.forecast.find(({ at }) => at >= middle) : undefined;
    return point ? [{ at: middle, words: t('ribbon.points.ahead', { when: format.date(middle), ...sharesOf(point, format) }) }] : [];
  });
  const highs = days.flatMap(({ middle, high }) =>
    high === null ? [] : [{ at: middle, words: t('ribbon.points.high', { when: format.date(middle), high: format.degrees(high) }) }],
  );
  return [...past, ...deliveries, ...ahead, ...highs].sort((a, b) => a.at - b.at);
}

const sharesOf = ({ likely, low, high }: ForecastPoint, { percent }: Format) => ({ likely: percent(likely), low: percent(low), high: percent(high) });
