import type { Ability } from '../../contract/ability';
import { accounts, allowed, and, contains, eq, gte, isNotNull, isNull, lt, nextTrucks, sql, stores, type SQL } from '../../db';
import { hasTruck, noTruck } from '../../db/views/stores';
import { addDays, dayOf, startOfDay } from '../../domain/civil';
import type { ProducerContext } from '../../http/context';
import { readCursor } from '../cursor';

export interface StoreFilter {
  q?: string;
  district?: string;
  account?: string;
  retired?: 'only';
  truck?: 'today' | 'late' | 'none';
}

/**
 * The stores this viewer may see that a list was asked for, in a statement that joins their account and, for `truck`,
 * their next truck. Retired ones are for whoever could bring them back.
 */
export function storesWanted({ ability, now, producer }: Pick<ProducerContext, 'ability' | 'now' | 'producer'>, filter: StoreFilter): SQL {
  const { q, district, account, retired, truck } = filter;
  const wanted = and(
    allowed(ability, 'read', 'Store', { id: stores.id }),
    retired ? isNotNull(stores.retiredAt) : isNull(stores.retiredAt),
    retired ? allowed(ability, 'update', 'Store', { id: stores.id }) : undefined,
    q ? contains(q, stores.name, stores.street, stores.city, accounts.name) : undefined,
    district ? eq(stores.districtId, district) : undefined,
    account ? eq(stores.accountId, account) : undefined,
    truck ? truckIs(truck, ability, now, producer.timeZone) : undefined,
  );
  return wanted ?? sql`0`;
}

function truckIs(when: 'today' | 'late' | 'none', ability: Ability, now: number, timeZone: string): SQL {
  const seen = allowed(ability, 'read', 'NextTruck', { storeId: stores.id });
  if (when === 'none') return sql`${noTruck} and ${seen}`;
  if (when === 'late') return sql`${hasTruck(lt(nextTrucks.to, now))} and ${seen}`;
  const today = dayOf(now, timeZone);
  const within = and(gte(nextTrucks.from, startOfDay(today, timeZone)), lt(nextTrucks.from, startOfDay(addDays(today, 1), timeZone)));
  return sql`${hasTruck(within ?? sql`0`)} and ${seen}`;
}

/** Stores in the order of their names, from behind the last one shown. */
export function behindByName(after: string | undefined): SQL {
  const cursor = readCursor(after, ['string', 'string']);
  return cursor ? sql`(${stores.name}, ${stores.id}) > (${cursor[0]}, ${cursor[1]})` : sql`1`;
}
