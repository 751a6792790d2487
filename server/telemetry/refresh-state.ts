import { and, desc, eq, freezerDays, freezers, freezerStates, gte, installs, isNull, sensors, sql, writeFleetRows, type Database, type ProducerDb } from '../db';
import { freezersView } from '../db/views/freezers';
import { recentReadings } from '../db/views/readings';
import { foldReadings, type Folded, type FreezerState } from '../domain/freezer-state';
import type { Reading } from '../domain/types';
import { celsiusToFahrenheit, metresToInches } from '../domain/units';

/** How far back a state looks from its newest reading; a function of the readings, not of the clock. */
export const WINDOW_MS = 8 * 86_400_000;

/** Works out anew what the readings of the sensor now in this freezer mean, and how lists show it. */
export function refreshState(db: Database, scoped: ProducerDb, freezerId: string): void {
  const folded = foldOf(db, scoped, freezerId, Number.MAX_SAFE_INTEGER);
  if (folded) {
    keepState(scoped, freezerId, folded.state);
    keepDays(scoped, folded);
  } else {
    scoped.delete(freezerStates, eq(freezerStates.id, freezerId));
  }
  writeFleetRows(scoped, { freezerId });
}

/** Keeps the days before `until`, for readings that came in from a past longer than a state looks back. */
export function refreshDays(db: Database, scoped: ProducerDb, freezerId: string, until: number): void {
  const folded = foldOf(db, scoped, freezerId, until);
  if (folded) keepDays(scoped, folded);
}

interface FreezerFolded extends Folded {
  freezerId: string;
  storeId: string;
}

function foldOf(db: Database, scoped: ProducerDb, freezerId: string, until: number): FreezerFolded | null {
  const [freezer] = freezersView(scoped, sql`${freezers.id} = ${freezerId}`, sql`${freezers.id}`, 1);
  const install = currentInstall(scoped, freezerId);
  if (!freezer || !install) return null;
  const folded = foldReadings({
    setup: { model: freezer.model, mount: { ...freezer.mount, probesIn: install.probesIn }, lanes: freezer.lanes },
    timeZone: freezer.timeZone,
    readings: readingsOf(db, install, until),
  });
  return folded && { ...folded, freezerId, storeId: freezer.storeId };
}

function keepState(scoped: ProducerDb, id: string, state: FreezerState): void {
  const row = {
    at: state.at,
    pounds: state.level.pounds,
    capacityPounds: state.level.capacityPounds,
    share: state.level.share,
    airF: state.airF,
    warmSince: state.warmSince,
    runOutEarly: state.runOut.early,
    runOutLikely: state.runOut.likely,
    runOutLate: state.runOut.late,
    state,
  };
  scoped.upsert(freezerStates, { id, ...row }, row);
}

/** A day is written over by one of which at least as much is known, so the window's cut first day spoils none; it stays where it was lived. */
function keepDays(scoped: ProducerDb, { freezerId, storeId, days }: FreezerFolded): void {
  const known = new Map(daysSince(scoped, freezerId, days[0]?.day ?? '').map((row) => [row.day, row]));
  for (const { day, out, warm, known: knownMinutes } of days) {
    const before = known.get(day);
    const row = { outMinutes: out, warmMinutes: warm, knownMinutes };
    const same = before && before.outMinutes === out && before.warmMinutes === warm && before.knownMinutes === knownMinutes;
    if (same || (before && before.knownMinutes > knownMinutes)) continue;
    scoped.upsert(freezerDays, { id: `${freezerId} ${day}`, freezerId, storeId, day, ...row }, row);
  }
}

const daysSince = (scoped: ProducerDb, freezerId: string, day: string) => {
  const { day: column, outMinutes, warmMinutes, knownMinutes } = freezerDays;
  return scoped
    .select({ day: column, outMinutes, warmMinutes, knownMinutes })
    .from(freezerDays)
    .where(and(eq(freezerDays.freezerId, freezerId), gte(column, day)))
    .all();
};

function currentInstall(db: ProducerDb, freezerId: string) {
  return db
    .select({ no: sensors.no, from: installs.from, probesIn: installs.probesIn })
    .from(installs)
    .innerJoin(sensors, eq(sensors.id, installs.sensorId))
    .where(and(eq(installs.freezerId, freezerId), isNull(installs.to)))
    .orderBy(desc(installs.from))
    .limit(1)
    .get();
}

interface Hung {
  no: number;
  from: number;
  probesIn: number[];
}

const readingsOf = (db: Database, { no, from, probesIn }: Hung, until: number): Reading[] =>
  recentReadings(db, no, from, WINDOW_MS, until).map(({ at, probes, airC, supplyV }) => ({
    at,
    distancesIn: probesIn.map((_, i) => inches(probes[i] ?? null)),
    airF: airC === null ? null : celsiusToFahrenheit(airC),
    supplyV,
  }));

const inches = (metres: number | null): number | null => (metres === null ? null : metresToInches(metres));
