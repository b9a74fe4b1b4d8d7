import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import autocannon from "autocannon";
import type { BenchRow } from "./row.ts";
import { newestEntry, type Site } from "./site.ts";

const seconds = 6;

/** A public entry against a bare Express page that sends the same bytes, on the same machine in the same run. */
export async function benchPages(site: Site): Promise<BenchRow[]> {
  const entry = await newestEntry(site);
  const bytes = await (await fetch(entry)).text();
  const bare = await startBareExpress(bytes);
  await load(entry, 2);
  await load(bare.url, 2);
  const ours = await load(entry, seconds);
  const theirs = await load(bare.url, seconds);
  const first = await timeToFirstByte(entry);
  const bareFirst = await timeToFirstByte(bare.url);
  bare.stop();
  const ratio = ours / theirs;
  return [
    {
      name: "entry page, requests/s to bare Express with the same bytes",
      value: `${ours.toFixed(0)} to ${theirs.toFixed(0)}, ratio ${ratio.toFixed(2)}`,
      budget: "at least 0.33",
      ok: ratio >= 1 / 3,
    },
    {
      name: "entry page, median time to first byte to bare Express",
      value: `${first.toFixed(1)} ms to ${bareFirst.toFixed(1)} ms`,
    },
  ];
}

async function load(url: string, duration: number): Promise<number> {
  const result = await autocannon({ url, duration, connections: 10 });
  if (result.non2xx > 0) throw new Error(`${result.non2xx} answers from ${url} were not good`);
  return result.requests.average;
}

async function timeToFirstByte(url: string): Promise<number> {
  const times: number[] = [];
  for (let i = 0; i < 50; i += 1) {
    const before = performance.now();
    const answer = await fetch(url);
    times.push(performance.now() - before);
    await answer.arrayBuffer();
  }
  return times.sort((a, b) => a - b)[25] ?? 0;
}

/** In a process of its own, as ours is. */
async function startBareExpress(html: string) {
  const file = join(mkdtempSync(join(tmpdir(), "soapstone-bare-")), "page.html");
  writeFileSync(file, html);
  const server = spawn(process.execPath, ["--import", "tsx", "scripts/bench/bare-express.ts", file], {
    stdio: ["ignore", "pipe", "inherit"],
  });
  const [port] = (await once(server.stdout, "data")) as [Buffer];
  return { url: `http://localhost:${String(port).trim()}/`, stop: () => server.kill() };
}
