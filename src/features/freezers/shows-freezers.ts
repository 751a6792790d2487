import { api } from '../../../server/contract/index';

/** The answers that a change of a freezer or of its sensor makes old. */
export const showsFreezers = [
  api.freezers.read,
  api.freezers.readSettings,
  api.freezers.list,
  api.freezers.digest,
  api.freezers.map,
  api.stores.read,
  api.stores.list,
  api.sensors.find,
  api.sensors.listUnclaimed,
  api.audit.list,
];
