import { comparisonDays, type ComparedStore } from '../../contract/comparison';
import type { SQL } from '../../db';
import { minutesOfStores, storeCounts, type Since, type StoreCounts, type StoreMinutes } from '../../db/views/comparison';
import { addDays, dayOf, startOfDay } from '../../domain/civil';
import type { ProducerContext } from '../../http/context';

const DAY_MINUTES = 24 * 60;

/** The last four weeks, today among them, by the producer's days. */
export function fourWeeks({ now, producer: { timeZone } }: Pick<ProducerContext, 'now' | 'producer'>): Since {
  const day = addDays(dayOf(now, timeZone), 1 - comparisonDays);
  return { day, at: startOfDay(day, timeZone) };
}

export function comparedStores({ db, ability }: ProducerContext, where: SQL, since: Since, limit: number): ComparedStore[] {
  const counted = storeCounts(db, ability, where, since, limit);
  const minutes = minutesOfStores(db, counted.map(({ id }) => id), since);
  return counted.map((store) => withMinutes(store, minutes.get(store.id) ?? { out: 0, warm: 0, known: 0 }));
}

const withMinutes = ({ fitted, ...store }: StoreCounts, { out, warm, known }: StoreMinutes): ComparedStore => ({
  ...store,
  outDays: out / DAY_MINUTES,
  warmHours: warm / 60,
  known: fitted > 0 ? Math.min(1, known / (fitted * comparisonDays * DAY_MINUTES)) : 0,
});
