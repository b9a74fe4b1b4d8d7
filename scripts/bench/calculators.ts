import { calculators, runCalculator } from "#shared/calculators/registry.ts";
import type { BenchRow } from "./row.ts";

/** Inputs and budgets in ms that differ from the example and the common budget. */
const special: Readonly<Record<string, { name: string; inputs: object; budget: number; runs?: number }>> = {
  "saddle-cope": { name: "saddle-cope, 720 samples", inputs: { samples: 720 }, budget: 1 },
  "wishbone-travel": { name: "wishbone-travel", inputs: {}, budget: 4 },
  "stock-cutting": {
    name: "stock-cutting, 200 pieces of 12 lengths",
    inputs: { pieces: twelveLengths() },
    budget: 2000,
    runs: 2,
  },
};

const COMMON_BUDGET = 0.5;
const RUNS = 400;

/** Lengths in mm that share no handy factor, 200 pieces in all. */
function twelveLengths(): object[] {
  return Array.from({ length: 12 }, (_, index) => ({
    label: `P${index + 1}`,
    length: 310 + 157 * index,
    count: index < 8 ? 17 : 16,
  }));
}

/** What one sum takes, checking its inputs included: the median of many, on an engine that is warm. */
export function benchCalculators(): BenchRow[] {
  return calculators.map(({ id, example }) => {
    const {
      name,
      inputs,
      budget,
      runs = RUNS,
    } = special[id] ?? { name: id, inputs: {}, budget: COMMON_BUDGET };
    const time = median(id, { ...example, ...inputs }, runs);
    return {
      name: `calculator ${name}, one sum`,
      value: `${time.toFixed(3)} ms`,
      budget: `under ${budget} ms`,
      ok: time < budget,
    };
  });
}

function median(id: string, inputs: object, runs: number): number {
  const times: number[] = [];
  for (let run = 0; run < 2 * runs; run += 1) {
    const started = performance.now();
    const { ok } = runCalculator(id, inputs);
    const time = performance.now() - started;
    if (!ok) throw new Error(`The example of ${id} does not work`);
    if (run >= runs) times.push(time);
  }
  return times.sort((a, b) => a - b)[runs / 2] ?? 0;
}
