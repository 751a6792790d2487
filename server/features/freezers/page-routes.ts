import { api } from '../../contract';
import { row } from '../../contract/ability';
import { allowed, and, eq, freezers, requests, sql } from '../../db';
import { deliveriesOfFreezer, nextTruckOfStore } from '../../db/views/deliveries';
import { airOfFreezer, sensorsOfFreezer } from '../../db/views/freezer-page';
import { freezersView } from '../../db/views/freezers';
import { readableRequests, requestsView } from '../../db/views/requests';
import { storeView } from '../../db/views/stores';
import { problem } from '../../http/problem';
import { route } from '../../http/route';

export const freezerPageRoutes = [
  route(api.freezers.read, ({ db, ability, now }, { params }) => {
    const where = and(eq(freezers.id, params.freezerId), allowed(ability, 'read', 'Freezer', { id: freezers.id, storeId: freezers.storeId }));
    const [freezer] = freezersView(db, where ?? sql`0`, sql`${freezers.id}`, 1);
    const store = freezer && storeView(db, ability, freezer.storeId);
    if (!freezer || !store) throw problem('not-found');
    const sees = (type: 'NextTruck' | 'Delivery') => ability.can('read', row(type, { storeId: store.id }));
    const about = and(eq(requests.freezerId, freezer.id), readableRequests(ability));
    return {
      freezer,
      store,
      nextTruck: sees('NextTruck') ? nextTruckOfStore(db, store.id) : null,
      requests: requestsView(db, about ?? sql`0`, 10),
      deliveries: sees('Delivery') ? deliveriesOfFreezer(db, freezer, 10) : [],
      air: airOfFreezer(db, freezer.id, now),
      sensors: sensorsOfFreezer(db, freezer.id),
    };
  }),
];
