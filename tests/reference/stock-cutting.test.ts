import loadHighs, { type Highs } from "highs";
import { beforeAll, describe, expect, it } from "vitest";
import type { StockCuttingResults } from "#shared/calculators/stock-cutting/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

interface CutList {
  pieces: { label: string; length: number; count: number }[];
  stock: { length: number; count?: number; price?: number }[];
  kerf: number;
  trim: number;
}

/** Numerical Recipes' quick generator (from memory), so that the cases are the same on every machine. */
function generator(seed: number) {
  let state = seed >>> 0;
  return (below: number) => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return Math.floor((state / 2 ** 32) * below);
  };
}

const plan = (list: CutList) => resultsOf<StockCuttingResults>("stock-cutting", list);

/** Cost of a bar in what the plan makes least. */
const costOf = ({ stock }: CutList, index: number) =>
  stock.length === 1 ? 1 : (stock[index]?.price ?? stock[index]?.length ?? 0);

/** Least cost by trying everything: each piece goes into every bar that is open and into a new one of every kind. */
function exhaustive(list: CutList): number {
  const pieces = list.pieces
    .flatMap(({ length, count }) => new Array<number>(count).fill(length))
    .sort((a, b) => b - a);
  const left = list.stock.map(({ count }) => count ?? pieces.length);
  const rooms: number[] = [];
  let best = Number.POSITIVE_INFINITY;
  const place = (index: number, cost: number) => {
    if (cost >= best - 1e-9) return;
    const piece = pieces[index];
    if (piece === undefined) {
      best = cost;
      return;
    }
    const tried = new Set<number>();
    for (const [bar, room] of rooms.entries()) {
      if (room < piece - 1e-9 || tried.has(room)) continue;
      tried.add(room);
      rooms[bar] = room - piece - list.kerf;
      place(index + 1, cost);
      rooms[bar] = room;
    }
    for (const [kind, { length }] of list.stock.entries()) {
      if ((left[kind] ?? 0) <= 0 || length - list.trim < piece) continue;
      left[kind] = (left[kind] ?? 0) - 1;
      rooms.push(length - list.trim - piece - list.kerf);
      place(index + 1, cost + costOf(list, kind));
      rooms.pop();
      left[kind] = (left[kind] ?? 0) + 1;
    }
  };
  place(0, 0);
  return best;
}

function smallCase(seed: number): CutList {
  const random = generator(seed);
  const pieces = Array.from({ length: 2 + random(4) }, (_, index) => ({
    label: `P${index}`,
    length: 250 + random(1600),
    count: 1 + random(3),
  }));
  const second =
    [[], [{ length: 1900 + random(1200) }], [{ length: 2000, count: 1 + random(2) }]][seed % 3] ?? [];
  const stock = [{ length: 3000 }, ...second];
  const priced = seed % 4 === 0 ? stock.map((bar) => ({ ...bar, price: 20 + random(40) })) : stock;
  return { pieces, stock: priced, kerf: random(4), trim: random(2) * 10 };
}

/** That a plan can be cut: all pieces there, none too many, each bar long enough, no bar that is not on the rack. */
function checkCuts(list: CutList, { plans, bars }: StockCuttingResults) {
  const cut = new Map<string, number>();
  for (const { stock, cuts, count } of plans) {
    const pieces = cuts.reduce((sum, each) => sum + each.count, 0);
    const length = cuts.reduce((sum, each) => sum + each.count * each.length, 0);
    expect(length + (pieces - 1) * list.kerf).toBeLessThanOrEqual(stock - list.trim + 1e-9);
    for (const { label, count: each } of cuts) cut.set(label, (cut.get(label) ?? 0) + count * each);
  }
  expect([...cut].sort()).toEqual(list.pieces.map(({ label, count }) => [label, count]).sort());
  expect(plans.reduce((sum, { count }) => sum + count, 0)).toBe(bars);
  for (const { length, count } of list.stock) {
    const used = plans.reduce((sum, each) => sum + (each.stock === length ? each.count : 0), 0);
    expect(used).toBeLessThanOrEqual(count ?? Number.POSITIVE_INFINITY);
  }
}

const measured = ({ measure, bars, stockLength, cost }: StockCuttingResults) =>
  measure === "bars" ? bars : measure === "length" ? stockLength : cost;

describe("stock-cutting against exhaustive search", () => {
  it.each(Array.from({ length: 30 }, (_, seed) => seed))(
    "finds the least of small case %d and proves it",
    (seed) => {
      const list = smallCase(seed);
      const results = plan(list);
      checkCuts(list, results);
      expect(results.proven).toBe(true);
      expect(measured(results)).toBeCloseTo(exhaustive(list), 6);
      expect(results.lowerBound).toBeCloseTo(exhaustive(list), 6);
    },
  );
});

/** 200 pieces of 12 lengths. */
function largeCase(seed: number, least: number, most: number): CutList {
  const random = generator(seed);
  const lengths = new Set<number>();
  while (lengths.size < 12) lengths.add(least + random(most - least));
  const pieces = [...lengths].map((length, index) => ({ label: `P${index}`, length, count: 1 }));
  for (let rest = 188; rest > 0; rest -= 1) {
    const piece = pieces[random(12)];
    if (piece) piece.count += 1;
  }
  return { pieces, stock: [{ length: 6000 }], kerf: 3, trim: 0 };
}

/** All ways to cut a bar that leave no room for another piece. */
function fullPatterns({ pieces, stock, kerf, trim }: CutList): number[][] {
  const room = Math.max(...stock.map(({ length }) => length)) - trim + kerf;
  const patterns: number[][] = [];
  const shortest = Math.min(...pieces.map(({ length }) => length)) + kerf;
  const fill = (index: number, left: number, cuts: number[]) => {
    const piece = pieces[index];
    if (!piece) {
      if (left < shortest) patterns.push(cuts);
      return;
    }
    const size = piece.length + kerf;
    for (let count = Math.min(piece.count, Math.floor(left / size)); count >= 0; count -= 1) {
      fill(index + 1, left - count * size, [...cuts, count]);
    }
  };
  fill(0, room, []);
  return patterns;
}

describe("stock-cutting against the bound of HiGHS over all patterns", () => {
  let highs: Highs;
  beforeAll(async () => {
    highs = await loadHighs();
  });

  /** Linear programme over every pattern, so that its value bounds every plan. */
  function boundOf(list: CutList): number {
    const patterns = fullPatterns(list);
    const names = patterns.map((_, index) => `x${index}`);
    const rows = list.pieces.map(({ count }, type) => {
      const terms = patterns.flatMap((cuts, index) => (cuts[type] ? [`${cuts[type]} x${index}`] : []));
      return `r${type}: ${terms.join(" + ")} >= ${count}`;
    });
    const solution = highs.solve(
      `Minimize\nobj: ${names.join(" + ")}\nSubject To\n${rows.join("\n")}\nEnd\n`,
    );
    return Math.ceil(solution.ObjectiveValue - 1e-6);
  }

  it.each([
    [11, 900, 3000],
    [12, 1000, 3400],
    [13, 1100, 2500],
    [14, 1200, 5000],
  ])(
    "meets it with 200 pieces of 12 lengths, case %d, %d to %d mm, and says so within 2 s",
    (seed, least, most) => {
      const list = largeCase(seed, least, most);
      const started = performance.now();
      const results = plan(list);
      expect(performance.now() - started).toBeLessThan(2000);
      checkCuts(list, results);
      expect(results).toMatchObject({
        bars: boundOf(list),
        lowerBound: boundOf(list),
        proven: true,
        overBound: 0,
      });
    },
  );
});
