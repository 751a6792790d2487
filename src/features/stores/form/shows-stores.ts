import { api } from '../../../../server/contract/index';

/** The answers that say something of a store's settings. */
export const showsStores = [
  api.stores.list,
  api.stores.read,
  api.stores.readSettings,
  api.accounts.list,
  api.accounts.read,
  api.districts.list,
  api.trucks.list,
  api.freezers.list,
  api.freezers.map,
  api.audit.list,
];
