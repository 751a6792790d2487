import * as accounts from './accounts';
import * as audit from './audit';
import * as auth from './auth';
import * as comparison from './comparison';
import * as deliveries from './deliveries';
import * as districts from './districts';
import * as fleet from './fleet';
import * as freezerSettings from './freezer-settings';
import * as freezers from './freezers';
import * as models from './models';
import * as people from './people';
import * as products from './products';
import * as requests from './requests';
import * as sensors from './sensors';
import * as settings from './settings';
import * as storeSettings from './store-settings';
import * as stores from './stores';
import * as system from './system';
import * as telemetry from './telemetry';
import * as trucks from './trucks';
import type { Endpoint } from './endpoint';

/** The list that the server mounts, the client calls, OpenAPI describes and the tests enumerate. */
export const api = {
  auth: { requestLink: auth.requestLink, signIn: auth.signIn, readSession: auth.readSession, signOut: auth.signOut, readSeeing: auth.readSeeing, endSeeing: auth.endSeeing },
  me: { read: auth.me, update: auth.updateMe, sessions: auth.mySessions, endSession: auth.endSession },
  telemetry: { ingest: telemetry.ingest },
  accounts: { list: accounts.listAccounts, read: accounts.readAccount, create: accounts.createAccount, change: accounts.changeAccount },
  districts: { list: districts.listDistricts, create: districts.createDistrict, change: districts.changeDistrict },
  stores: {
    list: stores.listStores,
    read: stores.readStore,
    readSettings: storeSettings.readStoreSettings,
    create: storeSettings.createStore,
    change: storeSettings.changeStore,
  },
  freezers: {
    list: fleet.listFreezers,
    digest: fleet.digestFreezers,
    map: fleet.mapFreezers,
    csv: fleet.freezersCsv,
    read: freezers.readFreezer,
    readSettings: freezerSettings.readFreezerSettings,
    create: freezerSettings.createFreezer,
    change: freezerSettings.changeFreezer,
    tieSensor: freezerSettings.tieSensor,
    takeSensorOff: freezerSettings.takeSensorOff,
  },
  deliveries: {
    setNextTruck: deliveries.setNextTruck,
    clearNextTruck: deliveries.clearNextTruck,
    list: deliveries.listDeliveries,
    record: deliveries.recordDelivery,
  },
  trucks: { list: trucks.listTrucks, set: trucks.setTrucks },
  products: { list: products.listProducts, create: products.createProduct, change: products.changeProduct },
  models: { list: models.listModels, create: models.createModel, change: models.changeModel },
  comparison: { read: comparison.readComparison, csv: comparison.comparisonCsv },
  requests: {
    list: requests.listRequests,
    file: requests.fileRequest,
    read: requests.readRequest,
    change: requests.changeRequest,
    cancel: requests.cancelRequest,
    reply: requests.replyToRequest,
    note: requests.noteOnRequest,
    addPhotos: requests.addPhotos,
    readPhoto: requests.readPhoto,
    assignees: requests.listAssignees,
  },
  sensors: {
    listKeys: sensors.listKeys,
    createKey: sensors.createKey,
    revokeKey: sensors.revokeKey,
    listUnclaimed: sensors.listUnclaimed,
    find: sensors.findSensors,
    listQuarantined: sensors.listQuarantined,
  },
  people: {
    list: people.listPeople,
    invite: people.invitePerson,
    change: people.changePerson,
    inviteAgain: people.inviteAgain,
    seeAs: people.seeAs,
    places: people.listPlaces,
  },
  settings: {
    read: settings.readSettings,
    change: settings.changeSettings,
    setLogo: settings.setLogo,
    clearLogo: settings.clearLogo,
    readLogo: settings.readLogo,
  },
  audit: { list: audit.listAudit, csv: audit.auditCsv },
  system: { health: system.health, openapi: system.openapi },
  dev: {
    mail: system.devMail,
    mailOne: system.devMailOne,
    mailJson: system.devMailJson,
    people: system.devPeople,
    signIn: system.devSignIn,
  },
} as const;

export const endpoints: readonly Endpoint[] = Object.values(api).flatMap((noun) => Object.values<Endpoint>(noun));
