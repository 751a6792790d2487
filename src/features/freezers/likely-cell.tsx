import { useTranslation } from 'react-i18next';
import type { FleetRow } from '../../../server/contract/fleet';
import { comingTruck, levelUsable } from '../../../server/domain/fleet-standing';
import { SpanMini } from '../../freezer/span-mini';
import { useMembership } from '../../lib/me';
import { useStoreWords, type StoreWords } from '../stores/use-store-words';
import { Clocks } from './clocks';
import type { CellProps } from './fleet-cells';
import { Unknown } from './unknown';

const troubles = ['empty', 'first', 'soon', 'soon-untold'];

/** When it likely runs out: in words, and on the seven days ahead. */
export function LikelyCell({ row, standing, now, narrow }: CellProps) {
  const say = useStoreWords(useMembership().producer.timeZone, now);
  const { t } = useTranslation('freezers');
  if (!levelUsable(row, now)) return <Unknown />;
  const { early, likely, late, timeZone } = row;
  const between = early !== null && late !== null ? t('likely.between', { early: say.partOfDay(early), late: say.partOfDay(late) }) : t('likely.span');
  return (
    <span className="flex items-center gap-4">
      {!narrow && (
        <span className="hidden shrink-0 xl:block">
          <SpanMini now={now} early={early} likely={likely} late={late} truck={comingTruck(row.truck, now)} trouble={troubles.includes(standing.kind)} label={between} />
        </span>
      )}
      <span className="min-w-28 lg:shrink-0">{likely === null ? <NotSeen /> : <Clocks zone={timeZone} now={now} say={(words) => likelyWords({ ...row, likely }, words, now, t)} />}</span>
    </span>
  );
}

function NotSeen() {
  const { t } = useTranslation('freezers');
  return <span className="text-ink-3">{t('likely.none')}</span>;
}

/** No finer than a part of a day; what was likely to happen by now is only likely. */
function likelyWords({ at, likely }: FleetRow & { likely: number }, say: StoreWords, now: number, t: (key: string) => string): string {
  if (at !== null && likely <= at) return t('likely.now');
  return likely <= now ? t('likely.by-now') : say.partOfDay(likely);
}
