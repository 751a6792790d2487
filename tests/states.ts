import type { FreezerState } from '../server/domain/freezer-state';

const hour = 3_600_000;
const day = 24 * hour;

interface Wanted {
  at: number;
  /** Of the likely run-out. */
  likely: number;
  /** Names of the two lanes' products. */
  products: [string, string];
  supplyV?: number;
}

/** A freezer's state as readings could have left it, a third full. */
export function stateOf(id: (thing: string) => string, { at, likely, products, supplyV = 3 }: Wanted): FreezerState {
  const lane = (product: string, bags: number, bagPounds: number) => ({
    productId: id(product),
    pounds: bags * bagPounds,
    sdPounds: 20,
    capacityPounds: 750,
    bags,
    about: true,
    stackIn: 25,
    borrowed: false,
  });
  const runOut = { early: likely - day, likely, late: likely + 2 * day };
  const level = { pounds: 700, sdPounds: 30, capacityPounds: 1500, share: 700 / 1500, lanes: [lane(products[0], 40, 7), lane(products[1], 21, 20)] };
  return {
    at,
    level,
    distancesIn: [30, 31, 29],
    airF: 18,
    airAt: at,
    warmSince: null,
    supplyV,
    runOut: { ...runOut, lane: 0 },
    laneRunOuts: [runOut, { early: null, likely: null, late: null }],
    rates: [
      { poundsPerDay: 90, sdPounds: 20, days: 7 },
      { poundsPerDay: 60, sdPounds: 15, days: 7 },
    ],
    deliveries: [{ at: at - 2 * day, pounds: [300, 200] }],
    history: [[at - day, 0.6], [at, 700 / 1500]],
  };
}
