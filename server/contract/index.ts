import * as audit from './audit';
import * as auth from './auth';
import * as deliveries from './deliveries';
import * as freezers from './freezers';
import * as people from './people';
import * as requests from './requests';
import * as sensors from './sensors';
import * as stores from './stores';
import * as system from './system';
import * as telemetry from './telemetry';
import type { Endpoint } from './endpoint';

/** The list that the server mounts, the client calls, OpenAPI describes and the tests enumerate. */
export const api = {
  auth: { requestLink: auth.requestLink, signIn: auth.signIn, readSession: auth.readSession, signOut: auth.signOut },
  me: { read: auth.me, update: auth.updateMe, sessions: auth.mySessions, endSession: auth.endSession },
  telemetry: { ingest: telemetry.ingest },
  stores: { list: stores.listStores, read: stores.readStore },
  freezers: { list: freezers.listFreezers, read: freezers.readFreezer },
  deliveries: {
    setNextTruck: deliveries.setNextTruck,
    clearNextTruck: deliveries.clearNextTruck,
    list: deliveries.listDeliveries,
    record: deliveries.recordDelivery,
  },
  products: { list: deliveries.listProducts },
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
    listQuarantined: sensors.listQuarantined,
  },
  people: {
    list: people.listPeople,
    invite: people.invitePerson,
    change: people.changePerson,
    inviteAgain: people.inviteAgain,
    places: people.listPlaces,
  },
  audit: { list: audit.listAudit },
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
