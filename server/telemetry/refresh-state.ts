import { and, desc, eq, freezers, freezerStates, installs, isNull, sensors, sql, type Database, type ProducerDb } from '../db';
import { freezersView } from '../db/views/freezers';
import { recentReadings } from '../db/views/readings';
import { foldState } from '../domain/freezer-state';
import type { Reading } from '../domain/types';
import { celsiusToFahrenheit, metresToInches } from '../domain/units';

/** How far back a state looks from its newest reading; a function of the readings, not of the clock. */
const WINDOW_MS = 8 * 86_400_000;

/** Works out anew what the readings of the sensor now in this freezer mean, and keeps it as its one row. */
export function refreshState(db: Database, scoped: ProducerDb, freezerId: string): void {
  const [freezer] = freezersView(scoped, sql`${freezers.id} = ${freezerId}`, sql`${freezers.id}`, 1);
  const install = currentInstall(scoped, freezerId);
  if (!freezer || !install) return;
  const state = foldState({
    setup: { model: freezer.model, mount: { ...freezer.mount, probesIn: install.probesIn }, lanes: freezer.lanes },
    timeZone: freezer.timeZone,
    readings: readingsOf(db, install),
  });
  if (!state) return;
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
  scoped.upsert(freezerStates, { id: freezerId, ...row }, row);
}

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

function readingsOf(db: Database, { no, from, probesIn }: { no: number; from: number; probesIn: number[] }): Reading[] {
  return recentReadings(db, no, from, WINDOW_MS).map(({ at, probes, airC, supplyV }) => ({
    at,
    distancesIn: probesIn.map((_, i) => inches(probes[i] ?? null)),
    airF: airC === null ? null : celsiusToFahrenheit(airC),
    supplyV,
  }));
}

const inches = (metres: number | null): number | null => (metres === null ? null : metresToInches(metres));
