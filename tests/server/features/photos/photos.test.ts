import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { eq } from "drizzle-orm";
import sharp from "sharp";
import { thumbHashToApproximateAspectRatio } from "thumbhash";
import { v7 as uuid } from "uuid";
import { describe, expect, it } from "vitest";
import { users } from "#server/db/schema/accounts.ts";
import { photos } from "#server/db/schema/photos.ts";
import { scheduleCleaning } from "#server/features/photos/jobs.ts";
import type { Person } from "#server/http/viewer.ts";
import { photoLimits } from "#shared/contracts/photos.ts";
import {
  photoBlock,
  publish,
  readyPhoto,
  saveOver,
  startBuild,
  startEntry,
  uploadFile,
  words,
} from "#tests/factories/content.ts";
import { avif, heic, jpeg, movingWebp, phonePhoto, png, pngOfSize } from "#tests/factories/pictures.ts";
import { type ContentBench, contentBench } from "#tests/setup/content-bench.ts";

const day = 24 * 3600_000;
const text = (content: string) => Uint8Array.from(Buffer.from(content));

async function workshop() {
  const bench = await contentBench();
  const maren = bench.person("maren");
  const place = await startBuild(bench, maren);
  const upload = (bytes: Uint8Array<ArrayBuffer>, name?: string) =>
    uploadFile(bench, maren, bytes, { purpose: "entry", build: place.build.id, ...(name && { name }) });
  return { bench, maren, place, upload };
}

function folderOf(bench: ContentBench, id: string): string {
  return join(bench.folder, "photos", id);
}

async function pictureBytes(bench: ContentBench, viewer: Person | null, url: string): Promise<Buffer> {
  const answer = await bench.fetchAs(viewer, url);
  expect(answer.status).toBe(200);
  return Buffer.from(await answer.arrayBuffer());
}

describe("POST /api/photos", () => {
  it("answers with the photo's shape and a placeholder before its pictures are made", async () => {
    const { upload } = await workshop();
    const { status, body } = await upload(await jpeg());
    expect(status).toBe(201);
    expect(body).toMatchObject({ state: "processing", width: 1200, height: 800, webp: [], avif: [] });
    const stored = Buffer.from(body.placeholder, "base64");
    expect(stored.length).toBeLessThan(40);
    expect(thumbHashToApproximateAspectRatio(stored)).toBeCloseTo(1.5, 0);
  });

  it("makes WebP pictures first, then AVIF, in the widths the photo has", async () => {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 1200, height: 800 }));
    expect(photo).toMatchObject({ state: "ready", failure: null });
    for (const format of ["webp", "avif"] as const) {
      expect(photo[format].map((each) => each.width)).toEqual([480, 960, 1200]);
      for (const { width, url } of photo[format]) {
        const answer = await bench.fetchAs(maren, url);
        expect(answer.headers.get("content-type")).toBe(`image/${format}`);
        const metadata = await sharp(Buffer.from(await answer.arrayBuffer())).metadata();
        expect([metadata.width, metadata.height]).toEqual([width, (width * 2) / 3]);
        expect(metadata.format).toBe(format === "avif" ? "heif" : "webp");
      }
    }
  });

  it("never enlarges a photo", async () => {
    const { bench, maren, place } = await workshop();
    const small = await readyPhoto(bench, maren, place.build, await jpeg({ width: 300, height: 200 }));
    expect(small.webp.map((each) => each.width)).toEqual([300]);
    const large = await readyPhoto(bench, maren, place.build, await jpeg({ width: 2000, height: 1000 }));
    expect(large.webp.map((each) => each.width)).toEqual([480, 960, 1600]);
  });

  it("leaves no trace of where and by whom a photo was taken", async () => {
    const { bench, maren, place } = await workshop();
    const bytes = await phonePhoto({ width: 600, height: 400 }, 1);
    const before = await sharp(bytes).metadata();
    expect(Buffer.from(bytes).includes("LOWBARN-OWNER")).toBe(true);
    // Tag 0x8825 of EXIF 2.32 (CIPA DC-008), section 4.6.3: the pointer to the GPS part.
    expect(
      before.exif?.includes(Buffer.from([0x25, 0x88])) || before.exif?.includes(Buffer.from([0x88, 0x25])),
    ).toBe(true);
    const photo = await readyPhoto(bench, maren, place.build, bytes);
    const files = readdirSync(folderOf(bench, photo.id));
    expect(files.sort()).toEqual(["0-480.avif", "0-480.webp", "0-600.avif", "0-600.webp", "master"]);
    for (const file of files) {
      const kept = readFileSync(join(folderOf(bench, photo.id), file));
      const { exif, xmp, iptc, icc, orientation } = await sharp(kept).metadata();
      expect({ exif, xmp, iptc, icc, orientation }).toEqual({});
      expect(kept.includes("LOWBARN")).toBe(false);
      expect(kept.includes("Exif")).toBe(false);
    }
    expect(readdirSync(join(bench.folder, "incoming"))).toEqual([]);
  });

  it("turns a photo upright as its EXIF says", async () => {
    const { bench, maren, place } = await workshop();
    // Orientation 6 of EXIF 2.32, table 6: the first row is the right side, so red (left) comes to the top.
    const bytes = await phonePhoto({ width: 600, height: 400 }, 6);
    const photo = await readyPhoto(bench, maren, place.build, bytes);
    expect(photo).toMatchObject({ width: 400, height: 600 });
    const picture = await pictureBytes(bench, maren, photo.webp[0]?.url ?? "");
    expect(await colourAt(picture, { x: 0.5, y: 0.1 })).toBe("red");
    expect(await colourAt(picture, { x: 0.5, y: 0.9 })).toBe("blue");
  });

  it("takes a PNG that is called .jpg, and an AVIF, for what they are", async () => {
    const { upload } = await workshop();
    expect((await upload(await png(), "photo.jpg")).status).toBe(201);
    expect((await upload(await avif(), "photo.png")).status).toBe(201);
  });

  it.each([
    ["text", text("<!doctype html><script>alert(1)</script>")],
    ["a drawing", text('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>')],
    ["a PDF", text("%PDF-1.7\n1 0 obj\n<<>>\nendobj\ntrailer\n<<>>")],
    ["a GIF", text("GIF89a\u0001\u0000\u0001\u0000")],
    ["nothing", new Uint8Array(0)],
  ])("refuses %s that is called photo.jpg", async (_name, bytes) => {
    const { bench, upload } = await workshop();
    const answer = await upload(bytes);
    expect(answer).toMatchObject({ status: 415, body: { error: { code: "unsupported_media" } } });
    expect(answer.body.error.message).toContain("Upload a JPEG, PNG, WebP or AVIF picture");
    expect(readdirSync(join(bench.folder, "incoming"))).toEqual([]);
    expect(bench.database.select().from(photos).all()).toEqual([]);
  });

  it("refuses a HEIC photo and says what to do", async () => {
    const { upload } = await workshop();
    const answer = await upload(heic(), "IMG_0001.HEIC");
    expect(answer.status).toBe(415);
    expect(answer.body.error.message).toContain("Save or share it as a JPEG");
  });

  it("refuses a picture that moves", async () => {
    const { upload } = await workshop();
    const answer = await upload(await movingWebp());
    expect(answer.status).toBe(415);
    expect(answer.body.error.message).toContain("moves");
  });

  it("refuses a photo that is cut short", async () => {
    const { upload } = await workshop();
    const whole = await jpeg();
    const answer = await upload(whole.slice(0, Math.floor(whole.length / 2)));
    expect(answer.status).toBe(415);
    expect(answer.body.error.message).toContain("cut short");
  });

  it("refuses too many pixels by the header alone, with both numbers", async () => {
    const { upload } = await workshop();
    const answer = await upload(pngOfSize({ width: 10_000, height: 9_000 }));
    expect(answer).toMatchObject({ status: 413, body: { error: { code: "too_large" } } });
    expect(answer.body.error.message).toContain("90 million pixels; 60 million are the most");
  });

  it("refuses too many bytes while they come in", async () => {
    const { bench, upload } = await workshop();
    const answer = await upload(new Uint8Array(photoLimits.bytes + 1));
    expect(answer).toMatchObject({ status: 413, body: { error: { code: "too_large" } } });
    expect(answer.body.error.message).toContain("larger than 25 MB");
    expect(readdirSync(join(bench.folder, "incoming"))).toEqual([]);
  });

  it("refuses a second file in one upload", async () => {
    const { bench, maren } = await workshop();
    const form = new FormData();
    form.append("photo", new File([await png({ width: 8, height: 8 })], "a.png"));
    form.append("photo", new File([await png({ width: 8, height: 8 })], "b.png"));
    const answer = await bench.fetchAs(maren, "/api/photos", { method: "POST", body: form });
    expect(answer.status).toBe(422);
    expect((await answer.json()).error.message).toContain("one photo at a time");
  });

  it("refuses one photo more than a build may hold", async () => {
    const { bench, maren, place, upload } = await workshop();
    const rows = Array.from({ length: photoLimits.perBuild }, () => ({
      id: uuid(),
      ownerId: maren.id,
      buildId: place.build.id,
      purpose: "entry" as const,
      state: "ready" as const,
      width: 1,
      height: 1,
      bytes: 1,
      createdAt: 0,
    }));
    bench.database.insert(photos).values(rows).run();
    const answer = await upload(await png({ width: 8, height: 8 }));
    expect(answer.status).toBe(409);
    expect(answer.body.error.message).toContain("2000 photos");
  });

  it("turns away the signed out, and builders of other builds", async () => {
    const { bench, place } = await workshop();
    const fields = { purpose: "entry", build: place.build.id };
    const bytes = await png({ width: 8, height: 8 });
    expect((await uploadFile(bench, null, bytes, fields)).status).toBe(401);
    expect((await uploadFile(bench, bench.person("idris"), bytes, fields)).status).toBe(404);
    expect((await uploadFile(bench, bench.person("tam"), bytes, { purpose: "entry" })).status).toBe(422);
  });
});

async function colourAt(picture: Buffer, { x, y }: { x: number; y: number }): Promise<"red" | "blue"> {
  const { data, info } = await sharp(picture).removeAlpha().raw().toBuffer({ resolveWithObject: true });
  const at = (Math.floor(info.height * y) * info.width + Math.floor(info.width * x)) * info.channels;
  return (data[at] ?? 0) > (data[at + 2] ?? 0) ? "red" : "blue";
}

describe("POST /api/photos/:photo/rotate", () => {
  it("turns a photo clockwise without cropping, under new addresses", async () => {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 600, height: 400 }));
    const turned = await bench.send(maren, "POST", `/api/photos/${photo.id}/rotate`, { turn: 90 });
    expect(turned.body).toMatchObject({
      state: "processing",
      rotation: 90,
      width: 400,
      height: 600,
      webp: [],
    });
    await bench.queue.runDue();
    const { body } = await bench.send(maren, "GET", `/api/photos/${photo.id}`);
    expect(body.webp).toEqual([{ width: 400, url: `/photos/${photo.id}/90-400.webp` }]);
    const picture = await pictureBytes(bench, maren, body.webp[0].url);
    const { width, height } = await sharp(picture).metadata();
    expect([width, height]).toEqual([400, 600]);
    expect(await colourAt(picture, { x: 0.5, y: 0.1 })).toBe("red");
    const old = await pictureBytes(bench, maren, photo.webp[0]?.url ?? "");
    expect(await colourAt(old, { x: 0.1, y: 0.5 })).toBe("red");
  });

  it("comes back to where it was after turning back", async () => {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 600, height: 400 }));
    for (const turn of [-90, 90]) await bench.send(maren, "POST", `/api/photos/${photo.id}/rotate`, { turn });
    await bench.queue.runDue();
    expect((await bench.send(maren, "GET", `/api/photos/${photo.id}`)).body).toEqual(photo);
  });

  it("is for the photo's owner alone", async () => {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const path = `/api/photos/${photo.id}/rotate`;
    expect((await bench.send(bench.person("idris"), "POST", path, { turn: 90 })).status).toBe(404);
    expect((await bench.send(null, "POST", path, { turn: 90 })).status).toBe(401);
    expect((await bench.send(maren, "POST", path, { turn: 45 })).status).toBe(422);
  });
});

describe("GET /photos/:photo/:file", () => {
  async function photoInDraft() {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const draft = await startEntry(bench, maren, place);
    const document = { type: "doc", content: [photoBlock(photo.id, "The datum line on the bench")] };
    const saved = await saveOver(bench, maren, draft, { document });
    const url = photo.webp[0]?.url ?? "";
    const look = async (viewer: Person | null) => {
      const answer = await bench.fetchAs(viewer, url);
      return { status: answer.status, caching: answer.headers.get("cache-control") };
    };
    return { bench, maren, place, photo, draft: saved.body, look };
  }

  it("shows a draft's photo to its builder alone, and lets nobody keep it", async () => {
    const { bench, maren, photo, look } = await photoInDraft();
    expect(await look(maren)).toEqual({ status: 200, caching: "private, no-store" });
    expect((await look(null)).status).toBe(404);
    expect((await look(bench.person("joan", { role: "administrator" }))).status).toBe(404);
    expect((await bench.send(null, "GET", `/api/photos/${photo.id}`)).status).toBe(404);
  });

  it("shows a published photo to anyone, to be kept for ever", async () => {
    const { bench, maren, draft, look } = await photoInDraft();
    await publish(bench, maren, draft);
    expect(await look(null)).toEqual({ status: 200, caching: "public, max-age=31536000, immutable" });
  });

  it("hides it again when the entry is withdrawn, or published without it", async () => {
    const { bench, maren, draft, look } = await photoInDraft();
    const shown = await publish(bench, maren, draft);
    await bench.send(maren, "POST", `/api/entries/${draft.id}/withdraw`);
    expect((await look(null)).status).toBe(404);
    await publish(bench, maren, shown.body);
    expect((await look(null)).status).toBe(200);
    const without = await saveOver(bench, maren, shown.body, { document: words("No photo") });
    expect((await look(null)).status).toBe(200);
    await publish(bench, maren, without.body);
    expect((await look(null)).status).toBe(404);
  });

  it("shows a build's cover once the build is public", async () => {
    const { bench, maren, place, photo, look } = await photoInDraft();
    const path = `/api/builds/${place.build.slug}`;
    const set = await bench.send(maren, "PATCH", path, {
      coverPhotoId: photo.id,
      coverAlt: "Heron on stands",
    });
    expect(set.body.cover.id).toBe(photo.id);
    expect((await look(null)).status).toBe(404);
    const other = await startEntry(bench, maren, place, "Without photos");
    await publish(bench, maren, other);
    expect((await look(null)).status).toBe(200);
  });

  it("refuses a cover from another build", async () => {
    const { bench, maren, photo } = await photoInDraft();
    await startBuild(bench, maren, "Gantry");
    const answer = await bench.send(maren, "PATCH", "/api/builds/gantry", { coverPhotoId: photo.id });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.coverPhotoId).toContain("photo of this build");
  });

  it("shows a portrait while it is its owner's", async () => {
    const bench = await contentBench();
    const lise = bench.person("lise");
    const { body } = await uploadFile(bench, lise, await jpeg({ width: 60, height: 60 }), {
      purpose: "avatar",
    });
    await bench.queue.runDue();
    const look = async () => (await bench.fetchAs(null, `/photos/${body.id}/0-60.webp`)).status;
    expect(await look()).toBe(404);
    bench.database.update(users).set({ avatarPhotoId: body.id }).where(eq(users.id, lise.id)).run();
    expect(await look()).toBe(200);
  });

  it("knows no other file", async () => {
    const { bench, maren, photo } = await photoInDraft();
    for (const path of [
      `/photos/${photo.id}/master`,
      `/photos/${photo.id}/0-961.webp`,
      `/photos/${photo.id}/45-60.webp`,
      `/photos/${photo.id}/..%2F..%2Fincoming`,
      `/photos/${uuid()}/0-60.webp`,
      "/photos/incoming/0-60.webp",
    ]) {
      expect((await bench.fetchAs(maren, path)).status).toBe(404);
    }
  });

  it("finds out who may see a photo without scanning a table", async () => {
    const { bench, photo } = await photoInDraft();
    const seen: string[] = [];
    const client = bench.database.$client;
    const prepare = client.prepare.bind(client);
    client.prepare = (sql: string) => {
      seen.push(sql);
      return prepare(sql);
    };
    await bench.fetchAs(null, `/photos/${photo.id}/0-60.webp`);
    expect(seen).toHaveLength(1);
    const sql = seen[0] ?? "";
    const params = Array.from({ length: sql.split("?").length - 1 }, () => "x");
    const plan = prepare(`EXPLAIN QUERY PLAN ${sql}`).all(...params) as { detail: string }[];
    expect(
      plan.filter((line) => line.detail.startsWith("SCAN ") && !line.detail.includes("CONSTANT")),
    ).toEqual([]);
  });
});

describe("POST /api/entries/:entry/publish with photos", () => {
  it("asks for a description, naming the photo, unless it is decoration", async () => {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const draft = await startEntry(bench, maren, place);
    const blocks = (alt: string | null) => ({
      type: "doc",
      content: [photoBlock(photo.id, "The bench"), photoBlock(photo.id, alt, "Rack tray")],
    });
    const untold = await saveOver(bench, maren, draft, { document: blocks(null) });
    const refused = await publish(bench, maren, untold.body);
    expect(refused.status).toBe(422);
    expect(refused.body.error.message).toBe(
      'Photo 2 ("Rack tray") has no description. Say what it shows, or mark it as decoration.',
    );
    const told = await saveOver(bench, maren, untold.body, { document: blocks("") });
    expect((await publish(bench, maren, told.body)).status).toBe(200);
    const page = await bench.send(null, "GET", "/api/builds/heron");
    expect(page.body.entries[0]).toMatchObject({ photo: { id: photo.id }, photoAlt: "The bench" });
  });
});

describe("DELETE /api/photos/:photo", () => {
  it("keeps a photo that a draft or a revision holds, and deletes it with its files otherwise", async () => {
    const { bench, maren, place } = await workshop();
    const photo = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const loose = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const draft = await startEntry(bench, maren, place);
    const document = { type: "doc", content: [photoBlock(photo.id, null)] };
    const saved = await saveOver(bench, maren, draft, { document });
    const remove = (id: string, viewer: Person = maren) => bench.send(viewer, "DELETE", `/api/photos/${id}`);
    expect((await remove(photo.id)).status).toBe(409);
    bench.time.now += 10 * 60_000;
    await saveOver(bench, maren, saved.body, { document: words("Without it") });
    expect((await remove(photo.id)).status).toBe(409);
    expect((await remove(loose.id, bench.person("idris"))).status).toBe(404);
    expect((await remove(loose.id)).status).toBe(200);
    expect(existsSync(folderOf(bench, loose.id))).toBe(false);
    expect(existsSync(folderOf(bench, photo.id))).toBe(true);
  });
});

describe("scheduleCleaning", () => {
  it("deletes photos that nothing used for two weeks, and keeps the others", async () => {
    const { bench, maren, place } = await workshop();
    const used = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const unused = await readyPhoto(bench, maren, place.build, await jpeg({ width: 60, height: 40 }));
    const draft = await startEntry(bench, maren, place);
    await saveOver(bench, maren, draft, { document: { type: "doc", content: [photoBlock(used.id, null)] } });
    scheduleCleaning({ queue: bench.queue, clock: () => bench.time.now });
    bench.time.now += 13 * day;
    await bench.queue.runDue();
    expect(existsSync(folderOf(bench, unused.id))).toBe(true);
    bench.time.now += 2 * day;
    await bench.queue.runDue();
    expect(existsSync(folderOf(bench, unused.id))).toBe(false);
    expect(existsSync(folderOf(bench, used.id))).toBe(true);
  });
});

describe("registerPhotoJobs", () => {
  it("says in the photo's state that no pictures could be made", async () => {
    const { bench, upload, maren } = await workshop();
    const { body } = await upload(await jpeg({ width: 60, height: 40 }));
    await bench.storage.removeFolder(`photos/${body.id}`);
    for (let attempt = 0; attempt < 8; attempt += 1) {
      await bench.queue.runDue();
      bench.time.now += day;
    }
    const answer = await bench.send(maren, "GET", `/api/photos/${body.id}`);
    expect(answer.body).toMatchObject({ state: "failed", webp: [] });
    expect(answer.body.failure).toContain("upload it again");
  });
});
