/** The nouns the computation speaks of. Inside: pounds, inches, degrees Fahrenheit, milliseconds since 1970 UTC. */

export interface Model {
  insideWidthIn: number;
  insideDepthIn: number;
  insideHeightIn: number;
  ratedPounds: number;
}

/** How the sensor hangs: `probesIn` are distances of each probe from the left inside wall, left to right. */
export interface Mount {
  channelDropIn: number;
  rackIn: number;
  headroomIn: number;
  probesIn: number[];
}

/** Left to right; shares of the inside width sum to one. */
export interface Lane {
  productId: string;
  widthShare: number;
  bagPounds: number;
}

export interface FreezerSetup {
  model: Model;
  mount: Mount;
  lanes: Lane[];
}

/** One reading; `null` where the sensor said nothing for that channel. Distances follow `mount.probesIn`. */
export interface Reading {
  at: number;
  distancesIn: (number | null)[];
  airF: number | null;
  supplyV: number | null;
}

export interface LaneLevel {
  productId: string;
  pounds: number;
  sdPounds: number;
  capacityPounds: number;
  /** Whole bags, rounded down. */
  bags: number;
  /** The count is uncertain by more than one bag: say "about". */
  about: boolean;
  stackIn: number;
  /** No live probe of its own: the nearest probe was borrowed. */
  borrowed: boolean;
}

export interface Level {
  pounds: number;
  sdPounds: number;
  capacityPounds: number;
  /** 0 to 1. */
  share: number;
  lanes: LaneLevel[];
}

export interface RunOut {
  /** 10, 50 and 90 %; `null` beyond the horizon. */
  early: number | null;
  likely: number | null;
  late: number | null;
}
