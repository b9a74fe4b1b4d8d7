import { runCalculator } from "#shared/calculators/registry.ts";
import type { BenchRow } from "./row.ts";

/** Copes worked in a second, inputs checked and all: what one key pressed in a working costs. */
export async function benchCope(): Promise<BenchRow> {
  const work = (step: number) =>
    runCalculator("saddle-cope", {
      headerOd: 44.5,
      branchOd: 38.1,
      branchWall: 2.5,
      angle: 45 + (step % 45),
      offset: 2,
    });
  for (let step = 0; step < 50; step += 1) work(step);
  const start = performance.now();
  let count = 0;
  while (performance.now() - start < 1000) {
    if (!work(count).ok) throw new Error("the cope of the benchmark does not work");
    count += 1;
  }
  const perSecond = (1000 * count) / (performance.now() - start);
  return { name: "Copes per second", value: `${Math.round(perSecond)} /s` };
}
