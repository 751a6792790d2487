import type { StoreNow } from '../../../server/domain/answers';
import type { FreezerNow } from '../../../server/domain/freezer-standing';

/** Tuesday, December 1, 2026, 7:00 in Chicago (UTC−6). */
export const now = Date.UTC(2026, 11, 1, 13);
export const minute = 60_000;
export const hour = 60 * minute;
export const dayMs = 24 * hour;

type State = NonNullable<FreezerNow['state']>;

/** Two lanes, 7 lb and 20 lb; the 20 lb side runs out Friday at 18:00, early Friday noon, late Saturday 8:00. */
export const state = (over: Partial<State> = {}): State => ({
  at: now - 12 * minute,
  level: { pounds: 900, sdPounds: 30, capacityPounds: 1500, lanes: [{ bags: 88 }, { bags: 14 }] },
  airF: 18,
  airAt: now - 12 * minute,
  warmSince: null,
  laneRunOuts: [
    { early: null, likely: null, late: null },
    { early: now + 3 * dayMs + 5 * hour, likely: now + 3 * dayMs + 11 * hour, late: now + 4 * dayMs + hour },
  ],
  rates: [{ days: 7 }, { days: 7 }],
  ...over,
});

export const freezer = (over: Partial<FreezerNow> = {}): FreezerNow => ({
  id: 'f1',
  name: 'Front freezer',
  sensor: {},
  lanes: [{ bagPounds: 7 }, { bagPounds: 20 }],
  state: state(),
  ...over,
});

/** Thursday 9:40 to 11:10, 96 bags. */
export const thursday = {
  day: '2026-12-03',
  from: now + 2 * dayMs + 160 * minute,
  to: now + 2 * dayMs + 250 * minute,
  load: [{ bags: 60 }, { bags: 36 }],
};
export const saturday = { day: '2026-12-05', from: now + 4 * dayMs + 2 * hour, to: now + 4 * dayMs + 4 * hour, load: [{ bags: 40 }] };
/** Today from 6:00 to 7:30, so that 7:00 is inside it. */
export const today = { day: '2026-12-01', from: now - hour, to: now + 30 * minute, load: [{ bags: 96 }] };

export const store = (over: Partial<StoreNow> = {}): StoreNow => ({
  timeZone: 'America/Chicago',
  freezers: [freezer()],
  nextTruck: thursday,
  deliveries: [{ at: now - 3 * dayMs, lines: [{ bags: 104 }] }],
  deliveryDays: [2, 4],
  ...over,
});
