import { brotliCompressSync, gzipSync } from "node:zlib";
import type { BenchRow } from "./row.ts";
import { newestEntry, type Site } from "./site.ts";

const budgetKb = 120;

/** JavaScript that a reader's browser loads with an entry page, before anything is scrolled to or pressed. */
export async function benchBundle(site: Site): Promise<BenchRow[]> {
  const html = await (await fetch(await newestEntry(site))).text();
  const scripts = [...html.matchAll(/(?:src|href)="(\/assets\/[^"]+\.js)"/g)].map((match) => match[1] ?? "");
  let brotli = 0;
  let gzip = 0;
  for (const script of new Set(scripts)) {
    const bytes = Buffer.from(await (await fetch(site.url + script)).arrayBuffer());
    brotli += brotliCompressSync(bytes).length;
    gzip += gzipSync(bytes).length;
  }
  const kb = (bytes: number) => (bytes / 1000).toFixed(1);
  return [
    {
      name: "reader's first load, JavaScript compressed",
      value: `${kb(brotli)} kB brotli (${kb(gzip)} kB gzip), ${new Set(scripts).size} files`,
      budget: `under ${budgetKb} kB in brotli, as every browser takes it over HTTPS`,
      ok: brotli / 1000 < budgetKb,
    },
  ];
}
