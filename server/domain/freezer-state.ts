import type { FreezerSetup, Level, Reading, RunOut } from './types';
export interface FreezerState {
  at: number; level: Level; distancesIn: (number | null)[]; airF: number | null; airAt: number | null; warmSince: number | null; supplyV: number | null;
  runOut: RunOut & { lane: number | null }; laneRunOuts: RunOut[]; rates: { poundsPerDay: number; sdPounds: number; days: number }[];
  deliveries: { at: number; pounds: number[] }[]; history: [number, number][];
}
export const foldState = (_input: { setup: FreezerSetup; timeZone: string; readings: Reading[] }): FreezerState | null => null;
