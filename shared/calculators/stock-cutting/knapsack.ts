/** How many of each type of piece one bar gives. */
export type Cuts = readonly number[];

/** Most that a bar can be worth, for every capacity and for the types from one on; whole units of length. */
export interface Worth {
  sizes: readonly number[];
  values: readonly number[];
  /** `from[type][capacity]`: best worth of a bar filled with pieces of this type and the later ones. */
  from: readonly Float64Array[];
}

/**
 * Bounded knapsack for all capacities at once, by dynamic programming.
 *
 * @param sizes whole numbers above 0
 * @param limits how many of each there are
 * @param capacity the largest bar
 */
export function worthOf(
  sizes: readonly number[],
  values: readonly number[],
  limits: readonly number[],
  capacity: number,
): Worth {
  const from: Float64Array[] = [new Float64Array(capacity + 1)];
  for (let type = sizes.length - 1; type >= 0; type -= 1) {
    const best = Float64Array.from(from[0] ?? []);
    addType(best, sizes[type] ?? 1, values[type] ?? 0, limits[type] ?? 0);
    from.unshift(best);
  }
  return { sizes, values, from };
}

/** Lets the bar take up to `limit` more pieces of one type, in bundles of 1, 2, 4 and so on. */
function addType(best: Float64Array, size: number, value: number, limit: number) {
  if (value <= 0) return;
  let left = Math.min(limit, Math.floor((best.length - 1) / size));
  for (let bundle = 1; left > 0; bundle *= 2) {
    const count = Math.min(bundle, left);
    left -= count;
    const [step, gain] = [count * size, count * value];
    for (let room = best.length - 1; room >= step; room -= 1) {
      const taken = (best[room - step] ?? 0) + gain;
      if (taken > (best[room] ?? 0)) best[room] = taken;
    }
  }
}

/** The most valuable cuts of one bar. */
export function bestCuts(worth: Worth, limits: readonly number[], capacity: number): number[] {
  const { sizes, values, from } = worth;
  const cuts = sizes.map(() => 0);
  let room = capacity;
  for (const [type, size] of sizes.entries()) {
    const [here, later] = [from[type], from[type + 1]];
    let most = Math.min(limits[type] ?? 0, Math.floor(room / size));
    if ((values[type] ?? 0) <= 0) most = 0;
    // Sums made in another order differ in their last digits.
    const goal = (here?.[room] ?? 0) * (1 - 1e-12);
    let count = most;
    while (count > 0 && count * (values[type] ?? 0) + (later?.[room - count * size] ?? 0) < goal) count -= 1;
    cuts[type] = count;
    room -= count * size;
  }
  return cuts;
}

/**
 * All ways to cut a bar that are worth at least `least`, take at least one of `first`, and leave no room for another
 * piece that is still wanted.
 *
 * @param wanted how many of each type are still to be cut
 * @param spend called for each step of work; false ends the listing
 * @returns false when it was ended before its time
 */
export function listCuts(
  worth: Worth,
  wanted: readonly number[],
  first: number,
  capacity: number,
  least: number,
  spend: () => boolean,
  found: (cuts: number[], value: number) => void,
): boolean {
  const { sizes, values, from } = worth;
  const cuts = sizes.map(() => 0);
  const fill = (type: number, room: number, value: number): boolean => {
    if (!spend()) return false;
    if (value + (from[type]?.[room] ?? 0) < least) return true;
    if (type === sizes.length) {
      const open = sizes.some((size, each) => size <= room && (cuts[each] ?? 0) < (wanted[each] ?? 0));
      if (!open) found([...cuts], value);
      return true;
    }
    const size = sizes[type] ?? 1;
    const most = Math.min(wanted[type] ?? 0, Math.floor(room / size));
    for (let count = most; count >= (type === first ? 1 : 0); count -= 1) {
      cuts[type] = count;
      if (!fill(type + 1, room - count * size, value + count * (values[type] ?? 0))) return false;
    }
    cuts[type] = 0;
    return true;
  };
  return fill(0, capacity, 0);
}
