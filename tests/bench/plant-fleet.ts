import { accounts, districts, fillFleetRows, freezers, freezerStates, installs, lanes, memberships, membershipScopes, models, nextTrucks, people, producerDb, producers, products, sensors, stores, type Database } from '../../server/db';
import type { Role } from '../../server/contract/words';
import { seeded } from '../../server/demo/random';
import { idOf } from '../factories';
import { stateOf } from '../states';

export const slug = 'bench-ice';
export const id = (thing: string): string => idOf('bench', thing);
export const addressOf = (who: string): string => `${who}@bench.example`;

const DAY = 86_400_000;
const DISTRICTS = 10;
const FREEZERS_A_STORE = 2;
const towns = ['Alder Creek', 'Harrow Mill', 'Marlow', 'Cedar Gap', 'Tern Point', 'Stillwater', 'Gray Fox', 'Limestone'];
const names = ['Lantern Corner', 'Juniper Fuel', 'Campo Verde', 'Pelican Row', 'Ozark Lane', 'Heron Dock', 'Cattail Cove', 'Redbud Market'];

/** One producer with so many freezers in ten districts, as if each had been heard a moment ago. */
export function plantFleet(db: Database, count: number, now: number): void {
  const producerId = id('producer');
  db.insert(producers).values({ id: producerId, slug, name: 'Bench Ice', timeZone: 'America/Chicago', language: 'en', urgentPhone: '555-0100', createdAt: now }).run();
  const own = producerDb(db, producerId);
  const random = seeded('fleet');
  const storeCount = Math.ceil(count / FREEZERS_A_STORE);
  db.$client.transaction(() => {
    const createdAt = now - 300 * DAY;
    for (let i = 0; i < DISTRICTS; i += 1) own.insert(districts, { id: id(`district ${i}`), name: `District ${i}`, createdAt });
    for (let i = 0; i < 20; i += 1) own.insert(accounts, { id: id(`account ${i}`), number: String(1000 + i), name: `Account ${i}`, language: 'en', createdAt });
    own.insert(models, { id: id('model'), name: 'Two-door', insideWidthIn: 70, insideDepthIn: 30, insideHeightIn: 60, doors: 2, ratedPounds: 1500, defrost: 'auto', createdAt });
    for (const pounds of [7, 20]) own.insert(products, { id: id(`${pounds} lb`), name: `${pounds} lb`, bagPounds: pounds, createdAt });
    for (let s = 0; s < storeCount; s += 1) {
      const storeId = id(`store ${s}`);
      own.insert(stores, {
        id: storeId,
        accountId: id(`account ${s % 20}`),
        districtId: id(`district ${s % DISTRICTS}`),
        name: `${random.pick(names)} ${s}`,
        kind: 'convenience',
        street: `${random.whole(1, 2900)} Mill Street`,
        city: random.pick(towns),
        region: 'AR',
        postalCode: '72600',
        latitude: random.between(35, 37),
        longitude: random.between(-94, -92),
        timeZone: 'America/Chicago',
        language: 'en',
        phone: '555-0123',
        openHours: [6, 22],
        receivingHours: [],
        deliveryDays: [2, 4],
        createdAt,
      });
      const from = now + Math.round(random.between(0, 4 * DAY));
      own.insert(nextTrucks, { id: id(`truck ${s}`), storeId, day: new Date(from).toISOString().slice(0, 10), from, to: from + DAY / 16, updatedAt: now });
      for (let f = 0; f < FREEZERS_A_STORE; f += 1) plantFreezer(own, now, s * FREEZERS_A_STORE + f, storeId, random.between(0, 9 * DAY));
    }
    fillFleetRows(own);
    plantPeople(db, own, now, storeCount);
  })();
  db.$client.exec('analyze');
}

function plantFreezer(own: ReturnType<typeof producerDb>, now: number, number: number, storeId: string, likelyIn: number): void {
  const freezerId = id(`freezer ${number}`);
  const createdAt = now - 200 * DAY;
  own.insert(freezers, { id: freezerId, storeId, modelId: id('model'), assetNumber: String(400_000 + number), name: 'By the pumps', placement: 'outdoor', channelDropIn: 2, rackIn: 4, headroomIn: 4, createdAt });
  ['7 lb', '20 lb'].forEach((product, position) => own.insert(lanes, { id: id(`lane ${number} ${position}`), freezerId, position, productId: id(product), widthShare: 0.5 }));
  own.insert(sensors, { id: id(`sensor ${number}`), no: number + 1, serial: `urn:dev:os:32473-bench-${String(number).padStart(6, '0')}`, createdAt });
  own.insert(installs, { id: id(`install ${number}`), sensorId: id(`sensor ${number}`), freezerId, probesIn: [12, 35, 58], from: createdAt });
  const likely = Math.round(now + likelyIn);
  const state = stateOf(id, { at: now - 600_000, likely, products: ['7 lb', '20 lb'] });
  const { at, level, airF, warmSince, runOut } = state;
  own.insert(freezerStates, { id: freezerId, at, pounds: level.pounds, capacityPounds: level.capacityPounds, share: level.share, airF, warmSince, runOutEarly: runOut.early, runOutLikely: runOut.likely, runOutLate: runOut.late, state });
}

/** A dispatcher, a rep of three hundred stores, a manager of three. */
function plantPeople(db: Database, own: ReturnType<typeof producerDb>, now: number, storeCount: number): void {
  const someone = (who: string, role: Role, storesOf: number) => {
    db.insert(people).values({ id: id(who), email: addressOf(who), name: who, language: 'en', createdAt: now }).run();
    own.insert(memberships, { id: id(`${who} member`), personId: id(who), role, side: role === 'store-manager' ? 'store' : 'producer', createdAt: now });
    for (let i = 0; i < storesOf; i += 1) {
      const storeId = id(`store ${Math.floor((i * storeCount) / storesOf)}`);
      own.insert(membershipScopes, { id: id(`${who} scope ${i}`), membershipId: id(`${who} member`), storeId, districtId: null, accountId: null });
    }
  };
  someone('dispatcher', 'dispatcher', 0);
  someone('rep', 'district-rep', 300);
  someone('manager', 'store-manager', 3);
}
