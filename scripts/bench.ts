import { benchBundle } from "./bench/bundle.ts";
import { benchCalculators } from "./bench/calculators.ts";
import { benchCope } from "./bench/cope.ts";
import { benchPages } from "./bench/pages.ts";
import { benchPhotos } from "./bench/photos.ts";
import type { BenchRow } from "./bench/row.ts";
import { photosDone, startSite } from "./bench/site.ts";

/** Prints the performance table. Figures are noisy; what has a budget is a ratio within this one run. */
const site = await startSite();
try {
  await photosDone(site);
  const rows: BenchRow[] = [
    ...(await benchPages(site)),
    await benchCope(),
    ...benchCalculators(),
    ...(await benchPhotos(site)),
    ...(await benchBundle(site)),
  ];
  for (const { name, value, budget, ok } of rows) {
    const verdict = ok === undefined ? "" : ok ? "kept" : "MISSED";
    process.stdout.write(`${name}\n    ${value}${budget ? `   (budget ${budget}: ${verdict})` : ""}\n`);
  }
  process.exitCode = rows.some((row) => row.ok === false) ? 1 : 0;
} finally {
  await site.stop();
}
