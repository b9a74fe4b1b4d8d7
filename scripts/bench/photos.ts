import { setTimeout as wait } from "node:timers/promises";
import sharp from "sharp";
import type { PhotoView } from "#shared/contracts/photos.ts";
import { photoWidths } from "#shared/contracts/photos.ts";
import type { BenchRow } from "./row.ts";
import { newestEntry, type Site, signInDemoBuilder } from "./site.ts";

/** One 12-megapixel photo through the whole pipeline against bare sharp, and what readers feel meanwhile. */
export async function benchPhotos(site: Site): Promise<BenchRow[]> {
  const photo = await twelveMegapixels();
  const bare = await bareSharp(photo);
  const cookie = await signInDemoBuilder(site);
  const page = await newestEntry(site);
  const started = performance.now();
  const view = await upload(site, cookie, photo);
  const waits: number[] = [];
  let done = view;
  while (done.avif.length < photoWidths.length) {
    const before = performance.now();
    await (await fetch(page)).arrayBuffer();
    waits.push(performance.now() - before);
    await wait(20);
    const answer = await fetch(`${site.url}/api/photos/${view.id}`, { headers: { cookie } });
    done = (await answer.json()) as PhotoView;
    if (done.state === "failed") throw new Error("The photo failed");
  }
  const ours = performance.now() - started;
  const ratio = ours / bare;
  const p95 = waits.sort((a, b) => a - b)[Math.floor(waits.length * 0.95)] ?? 0;
  return [
    {
      name: "12-megapixel photo, upload to last picture, to bare sharp",
      value: `${(ours / 1000).toFixed(1)} s to ${(bare / 1000).toFixed(1)} s, ratio ${ratio.toFixed(2)}`,
      budget: "at most 1.3",
      ok: ratio <= 1.3,
    },
    {
      name: "entry page meanwhile, 95th percentile",
      value: `${p95.toFixed(1)} ms over ${waits.length} loads`,
      budget: "under 100 ms",
      ok: p95 < 100,
    },
  ];
}

/** A picture with the detail of a real one: noise over a gradient, as a camera would save it. */
async function twelveMegapixels(): Promise<Buffer> {
  const [width, height] = [4000, 3000];
  const noise = { type: "gaussian", mean: 128, sigma: 20 } as const;
  const picture = sharp({ create: { width, height, channels: 3, noise, background: "black" } });
  return picture.blur(1.2).jpeg({ quality: 90 }).toBuffer();
}

/** The same six pictures by sharp alone, with the same settings and one thread as the server uses. */
async function bareSharp(photo: Buffer): Promise<number> {
  sharp.concurrency(1);
  sharp.cache(false);
  const started = performance.now();
  for (const width of photoWidths) {
    await sharp(photo).autoOrient().resize({ width }).webp({ quality: 80 }).toBuffer();
    await sharp(photo).autoOrient().resize({ width }).avif({ quality: 55, effort: 3 }).toBuffer();
  }
  return performance.now() - started;
}

async function upload(site: Site, cookie: string, photo: Buffer): Promise<PhotoView> {
  const form = new FormData();
  form.set("purpose", "avatar");
  form.set("photo", new Blob([new Uint8Array(photo)], { type: "image/jpeg" }), "bench.jpg");
  const headers = { cookie, Origin: site.url };
  const answer = await fetch(`${site.url}/api/photos`, { method: "POST", body: form, headers });
  if (!answer.ok) throw new Error(`The upload failed: ${await answer.text()}`);
  return (await answer.json()) as PhotoView;
}
