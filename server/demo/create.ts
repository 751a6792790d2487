import { accounts, districts, freezers, installs, lanes, memberships, membershipScopes, models as modelTable, people, producerDb, producers, products, sensors, stores, type ProducerDb } from '../db';
import type { Language, StoreKind, Weekday } from '../contract/words';
import { isGtin } from '../domain/gtin';
import type { Services } from '../http/context';
import { contacts } from './data/contacts';
import { bagSizes, models, twoDoor, type DemoModel, type DemoPerson, type DemoProducer } from './data/producers';
import { comingHolidays } from './holidays';
import { seeded, type Random } from './random';

const DAY = 86_400_000;
const timeZone = 'America/Chicago';
export const historyDays = 120;

/** Writes one producer with everybody and everything but its history. Answers its id. */
export function createDemoProducer(services: Services, demo: DemoProducer): string {
  const { db, newId, now } = services;
  const id = newId();
  const { slug, name, language, urgentPhone, serviceHours, mailSender } = demo;
  const createdAt = now() - (historyDays + 30) * DAY;
  const holidays = comingHolidays(now(), timeZone, language);
  const sender = { senderName: mailSender.name, replyTo: mailSender.replyTo };
  db.insert(producers).values({ id, slug, name, language, urgentPhone, timeZone, serviceHours, holidays, ...sender, createdAt }).run();
  const plot: Plot = { demo, db: producerDb(db, id), newId, createdAt, now: now(), random: seeded(slug), ids: new Map(), nextSensorNo: services.system.nextSensorNo };
  createPlaces(plot);
  createFreezers(plot);
  for (const person of demo.people) createPerson(services, plot, person);
  return id;
}

interface Plot {
  demo: DemoProducer;
  db: ProducerDb;
  newId: () => string;
  createdAt: number;
  now: number;
  random: Random;
  /** By name, as the data names things. */
  ids: Map<string, string>;
  nextSensorNo: () => number;
}

function idOf({ ids }: Plot, name: string): string {
  const id = ids.get(name);
  if (!id) throw new Error(`the demo names ${name}, which is not there`);
  return id;
}

function named({ ids, newId }: Plot, name: string): string {
  const id = newId();
  ids.set(name, id);
  return id;
}

/** The language of a store, where it is not its producer's. */
const spoken = (store: string, usual: Language): Language => (/Campo Verde|Esquina/.test(store) ? 'es' : /Sandbar|Cactus/.test(store) ? 'en' : usual);

const usualDays: Weekday[][] = [[2, 5], [1, 4], [3, 6], [1, 3, 5], [2, 4, 6], [4, 7]];
const driverNotes = { en: 'Gate on the left; ring for the back door.', es: 'Portón a la izquierda; toque el timbre de atrás.' };
const kinds: StoreKind[] = ['convenience', 'fuel', 'grocery', 'bait'];

const terms = { en: 'Net 30', es: '30 días' };

function createPlaces(plot: Plot): void {
  const { db, demo, createdAt, random } = plot;
  for (const name of demo.districts) db.insert(districts, { id: named(plot, name), name, createdAt });
  demo.accounts.forEach((account, group) => {
    const accountId = named(plot, account.name);
    const { number, name, language } = account;
    db.insert(accounts, { id: accountId, number, name, terms: terms[language], language, contacts: contacts[number], createdAt });
    account.stores.forEach((store, i) => {
      const [south, north] = demo.area;
      db.insert(stores, {
        id: named(plot, store),
        accountId,
        districtId: idOf(plot, demo.districts[(i + group) % demo.districts.length] ?? ''),
        name: store,
        kind: kinds[group] ?? 'convenience',
        street: `${random.whole(100, 2900)} ${random.pick(demo.streets)}`,
        city: random.pick(demo.towns),
        region: demo.region,
        postalCode: `${demo.region === 'TX' ? '783' : '726'}${String(random.whole(10, 89))}`,
        latitude: Number(random.between(south?.[0] ?? 0, north?.[0] ?? 0).toFixed(4)),
        longitude: Number(random.between(south?.[1] ?? 0, north?.[1] ?? 0).toFixed(4)),
        timeZone,
        language: spoken(store, language),
        phone: `555-01${String(random.whole(10, 99))}`,
        urgentPhone: demo.urgentPhones[store],
        openHours: [6, 22],
        receivingHours: [{ days: [1, 2, 3, 4, 5, 6], from: '06:30', to: '15:00' }],
        deliveryDays: random.pick(usualDays),
        driverNotes: random.chance(0.3) ? driverNotes[demo.language] : '',
        createdAt,
      });
    });
  });
}

const placesAt = {
  en: ['Front freezer, by the register', 'Side wall, outdoors', 'By the pumps', 'Aisle end'],
  es: ['Congelador del frente, junto a la caja', 'Pared lateral, exterior', 'Junto a las bombas', 'Final del pasillo'],
};

const conditions = { en: ['good', 'good', 'worn'], es: ['bueno', 'bueno', 'gastado'] };

function createFreezers(plot: Plot): void {
  const { db, demo, createdAt } = plot;
  for (const pounds of bagSizes) {
    db.insert(products, { id: named(plot, `${pounds} lb`), name: `${pounds} lb`, bagPounds: pounds, gtin: gtinOf(demo, pounds), createdAt });
  }
  for (const model of models) {
    const { name, width, depth, height, doors, rated, defrost } = model;
    db.insert(modelTable, { id: named(plot, name), name, insideWidthIn: width, insideDepthIn: depth, insideHeightIn: height, doors, ratedPounds: rated, defrost, createdAt });
  }
  let number = 0;
  demo.accounts.flatMap((account) => account.stores).forEach((store, i) => {
    const count = i % 5 < 3 ? 1 : 2;
    for (let position = 0; position < count; position += 1) {
      number += 1;
      createFreezer(plot, { store, position, number, fittedAt: fittedAt(plot, store, position) });
    }
  });
}

/** The item's number is its pounds; the last digit is whichever makes it right. */
function gtinOf({ gtinPrefix }: DemoProducer, pounds: number): string | undefined {
  const digits = `${gtinPrefix}${String(pounds).padStart(5, '0')}`;
  return [...'0123456789'].map((check) => digits + check).find(isGtin);
}

/** Since when a sensor hangs in it; null where none does. */
function fittedAt({ demo, now, createdAt }: Plot, store: string, position: number): number | null {
  if (position === 1 && demo.unfitted.includes(store)) return null;
  return store === demo.newlyFitted ? now - 1.1 * DAY : createdAt;
}

/** A model with its lanes: the size of bag in each and its share of the width. */
function layoutOf({ demo, random }: Plot, store: string, position: number): { model: DemoModel; sizes: number[]; shares: number[] } {
  const wanted = position === 0 ? demo.layouts[store] : undefined;
  if (wanted) return { model: twoDoor, sizes: wanted, shares: [0.5, 0.5] };
  const model = random.pick(models);
  if (model.doors === 1 || (model.doors === 2 && random.chance(0.3))) return { model, sizes: [random.pick([7, 10])], shares: [1] };
  if (model.doors === 3 && random.chance(0.5)) return { model, sizes: bagSizes, shares: [0.34, 0.33, 0.33] };
  return { model, sizes: random.pick([[7, 20], [10, 20], [7, 10]]), shares: random.pick([[0.5, 0.5], [0.6, 0.4]]) };
}

interface Place {
  store: string;
  position: number;
  number: number;
  fittedAt: number | null;
}

function createFreezer(plot: Plot, { store, position, number, fittedAt }: Place): void {
  const { db, demo, random, createdAt, newId } = plot;
  const { model, sizes, shares } = layoutOf(plot, store, position);
  const outdoor = position === 1 || random.chance(0.4);
  const words = placesAt[spoken(store, demo.language)];
  const freezerId = newId();
  db.insert(freezers, {
    id: freezerId,
    storeId: idOf(plot, store),
    modelId: idOf(plot, model.name),
    assetNumber: String(40_100 + number),
    name: words[position === 0 ? (outdoor ? 2 : random.pick([0, 3])) : 1] ?? '',
    placement: outdoor ? 'outdoor' : 'indoor',
    condition: random.pick(conditions[demo.language]),
    channelDropIn: 1.5,
    rackIn: 2,
    headroomIn: 3,
    position,
    createdAt,
  });
  shares.forEach((widthShare, lane) =>
    db.insert(lanes, { id: newId(), freezerId, position: lane, productId: idOf(plot, `${sizes[lane] ?? 10} lb`), widthShare }),
  );
  if (fittedAt !== null) fitSensor(plot, { freezerId, number, fittedAt, width: model.width });
}

function fitSensor({ db, demo, newId, nextSensorNo }: Plot, { freezerId, number, fittedAt, width }: { freezerId: string; number: number; fittedAt: number; width: number }): void {
  const sensorId = newId();
  const serial = `${demo.serialPrefix}${String(number).padStart(4, '0')}`;
  db.insert(sensors, { id: sensorId, no: nextSensorNo(), serial, firstHeardAt: fittedAt, createdAt: fittedAt });
  const probesIn = [0.18, 0.5, 0.82].map((share) => Math.round(share * width * 2) / 2);
  db.insert(installs, { id: newId(), sensorId, freezerId, probesIn, from: fittedAt });
}

function createPerson({ db: raw, system, newId }: Services, plot: Plot, person: DemoPerson): void {
  const { db, createdAt } = plot;
  const { name, email, language, role, side } = person;
  const personId = system.personByEmail(email)?.id ?? newId();
  raw.insert(people).values({ id: personId, email, name, language, createdAt }).onConflictDoNothing().run();
  const membershipId = newId();
  db.insert(memberships, { id: membershipId, personId, role, side: side ?? (role === 'store-manager' ? 'store' : 'producer'), createdAt: createdAt + plot.ids.size });
  const scope = { membershipId, storeId: null, districtId: null, accountId: null };
  for (const store of person.stores ?? []) db.insert(membershipScopes, { id: newId(), ...scope, storeId: idOf(plot, store) });
  if (person.district) db.insert(membershipScopes, { id: newId(), ...scope, districtId: idOf(plot, person.district) });
  if (person.account) db.insert(membershipScopes, { id: newId(), ...scope, accountId: idOf(plot, person.account) });
}
