/** A small seeded generator (mulberry32), so that the demo is the same world every time. */
export interface Random {
  /** 0 up to 1. */
  next: () => number;
  between: (least: number, most: number) => number;
  whole: (least: number, most: number) => number;
  chance: (odds: number) => boolean;
  pick: <T>(list: readonly T[]) => T;
  normal: (sd: number) => number;
  poisson: (mean: number) => number;
}

export function seeded(seed: string | number): Random {
  let state = typeof seed === 'number' ? seed : hashOf(seed);
  const next = () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296;
  };
  const whole = (least: number, most: number) => least + Math.floor(next() * (most - least + 1));
  return {
    next,
    whole,
    between: (least, most) => least + next() * (most - least),
    chance: (odds) => next() < odds,
    pick: (list) => {
      const picked = list[whole(0, list.length - 1)];
      if (picked === undefined) throw new Error('nothing to pick from');
      return picked;
    },
    normal: (sd) => sd * Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next()),
    poisson: (mean) => {
      const limit = Math.exp(-mean);
      let count = 0;
      for (let product = next(); product > limit; product *= next()) count += 1;
      return count;
    },
  };
}

/** FNV-1a, 32 bits. */
function hashOf(text: string): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i += 1) hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193);
  return hash | 0;
}
