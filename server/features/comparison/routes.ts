import { api } from '../../contract';
import type { ComparedStore } from '../../contract/comparison';
import type { Language } from '../../contract/words';
import { and, sql } from '../../db';
import { dayOf } from '../../domain/civil';
import { sendCsv } from '../../http/csv';
import { route } from '../../http/route';
import { pageOf } from '../cursor';
import { behindByName, storesWanted } from '../stores/stores-wanted';
import { fileWords } from '../words';
import { comparedStores, fourWeeks } from './compared';

export const comparisonRoutes = [
  route(api.comparison.read, (ctx, { query: { limit = 50, after, q } }) => {
    const since = fourWeeks(ctx);
    const where = and(storesWanted(ctx, { q }), behindByName(after)) ?? sql`0`;
    const page = pageOf(comparedStores(ctx, where, since, limit + 1), limit, ({ name, id }) => [name, id]);
    return { since: since.at, stores: page.rows, next: page.next };
  }),

  route(api.comparison.csv, async (ctx, { query, res }) => {
    const { language, now, producer } = ctx;
    const stores = comparedStores(ctx, storesWanted(ctx, query), fourWeeks(ctx), ALL);
    await sendCsv(res, `${producer.slug}-comparison-${dayOf(now, producer.timeZone)}.csv`, [tableOf(stores, language)]);
    return undefined;
  }),
];

/** SQLite's word for no limit. */
const ALL = -1;

const columns: { head: Exclude<keyof ComparedStore, 'id' | 'name'> | 'store'; text: (store: ComparedStore) => string }[] = [
  { head: 'store', text: ({ name }) => name },
  { head: 'city', text: ({ city }) => city },
  { head: 'account', text: ({ account }) => account },
  { head: 'outDays', text: ({ outDays }) => outDays.toFixed(1) },
  { head: 'warmHours', text: ({ warmHours }) => warmHours.toFixed(1) },
  { head: 'known', text: ({ known }) => (known * 100).toFixed(0) },
  { head: 'openRequests', text: ({ openRequests }) => String(openRequests) },
  { head: 'solvedRequests', text: ({ solvedRequests }) => String(solvedRequests) },
  { head: 'deliveries', text: ({ deliveries }) => String(deliveries) },
  { head: 'lateDeliveries', text: ({ lateDeliveries }) => String(lateDeliveries) },
];

function tableOf(stores: ComparedStore[], language: Language): string[][] {
  const t = fileWords(language);
  return [columns.map(({ head }) => t(`comparison.${head}`)), ...stores.map((store) => columns.map(({ text }) => text(store)))];
}
