import * as z from 'zod/mini';
import { fault, id, language, phone, producerParams, spans, timeZone, version, withProducer, words } from './common';
import { endpoint } from './endpoint';
import { storeKinds } from './words';

const hourOfDay = z.number(fault('time')).check(z.minimum(0, fault('time')), z.maximum(24, fault('time')));
const degrees = (most: number) => z.number(fault('coordinate')).check(z.minimum(-most, fault('coordinate')), z.maximum(most, fault('coordinate')));

/** What is entered of a store. */
const entered = {
  name: words(120, 1),
  accountId: id,
  districtId: id,
  kind: z.enum(storeKinds, fault('choice')),
  street: words(160, 1),
  city: words(80, 1),
  region: words(40, 1),
  postalCode: words(20, 1),
  latitude: degrees(90),
  longitude: degrees(180),
  timeZone,
  language,
  phone,
  /** Whom to call when it is urgent; empty is the producer's own number. */
  urgentPhone: phone,
  /** Opens and closes, hours of the local day. */
  openHours: z.tuple([hourOfDay, hourOfDay]).check(z.refine(([from, to]) => from < to, { error: 'span-backwards', path: [1] })),
  /** When a driver may deliver. */
  receivingHours: spans,
  /** ISO weekdays on which the truck usually comes. */
  deliveryDays: z.array(z.literal([1, 2, 3, 4, 5, 6, 7])).check(z.maxLength(7, fault('weekdays'))),
  driverNotes: words(1000),
};

const storeSettings = z.object({ id, ...entered, retired: z.boolean(), version });
export type StoreSettings = z.output<typeof storeSettings>;

export const readStoreSettings = endpoint({
  id: 'stores.readSettings',
  method: 'get',
  path: '/api/:producer/stores/:storeId/settings',
  access: { kind: 'may', action: 'update', subject: 'Store' },
  params: withProducer({ storeId: id }),
  result: storeSettings,
  problems: ['not-found'],
});

export const createStore = endpoint({
  id: 'stores.create',
  method: 'post',
  path: '/api/:producer/stores',
  access: { kind: 'may', action: 'create', subject: 'Store' },
  params: producerParams,
  body: z.strictObject(entered),
  status: 201,
  result: storeSettings,
  problems: ['bad-input', 'not-allowed', 'place-unknown'],
});

export const changeStore = endpoint({
  id: 'stores.change',
  method: 'patch',
  path: '/api/:producer/stores/:storeId',
  access: { kind: 'may', action: 'update', subject: 'Store' },
  params: withProducer({ storeId: id }),
  body: z.strictObject({ version, ...z.partial(z.object(entered)).shape, retired: z.optional(z.boolean()) }),
  result: storeSettings,
  problems: ['bad-input', 'not-found', 'not-allowed', 'place-unknown', 'changed-meanwhile', 'still-in-use'],
});
