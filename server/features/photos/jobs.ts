import { setImmediate as nextTurn } from "node:timers/promises";
import { z } from "zod";
import { decodeMaster, makePicture, type PictureFormat } from "./image.ts";
import { createOneAtATime } from "./one-at-a-time.ts";
import { deletePhotoRow, findPhoto, findUnusedBefore, updatePhotoTurned } from "./repository.ts";
import type { PhotoParts } from "./service.ts";
import type { Incoming } from "./upload.ts";
import { masterKey, pictureFile, pictureKey, widthsFor } from "./views.ts";

const turnedPhoto = z.object({ id: z.uuid(), rotation: z.int() });

type TurnedPhoto = z.infer<typeof turnedPhoto>;

const dayMs = 24 * 3600_000;
/** A draft that only a phone without reception holds has this long to come in before its photos go. */
const unusedForMs = 14 * dayMs;
const options = { concurrency: 1, attempts: 4, leaseMs: 10 * 60_000 };

/** Registers the jobs that make pictures (WebP first, so that the photo shows; then AVIF) and clean up. */
export function registerPhotoJobs(parts: PhotoParts & { incoming: Incoming }): void {
  const { database, queue, storage } = parts;
  const inTurn = createOneAtATime();

  async function makeWebp(photo: TurnedPhoto): Promise<void> {
    const widths = await makeAll(photo, "webp", () => {});
    if (!widths) return;
    updatePhotoTurned(database, photo, {
      state: "ready",
      failure: null,
      webpWidths: JSON.stringify(widths),
    });
    queue.enqueue("photo.avif", photo, { uniqueKey: `photo.avif:${photo.id}:${photo.rotation}` });
  }

  async function makeAvif(photo: TurnedPhoto): Promise<void> {
    await makeAll(photo, "avif", (widths) => {
      updatePhotoTurned(database, photo, { avifWidths: JSON.stringify(widths) });
    });
  }

  /** Makes every width; null when the photo is gone or has been turned again meanwhile. */
  async function makeAll(
    { id, rotation }: TurnedPhoto,
    format: PictureFormat,
    progress: (done: number[]) => void,
  ): Promise<number[] | null> {
    const photo = findPhoto(database, id);
    if (photo?.rotation !== rotation) return null;
    const master = await storage.read(masterKey(id));
    const widths = widthsFor(photo.width);
    // A photo shows by its WebP pictures: those of other photos go before this one's AVIF.
    const turn = format === "webp" ? "next" : "when_idle";
    const pixels = await inTurn(() => decodeMaster(master, { rotation, width: Math.max(...widths) }), turn);
    const done: number[] = [];
    for (const width of widths) {
      const bytes = await inTurn(() => makePicture(pixels, { width, format }), turn);
      await storage.write(pictureKey(id, pictureFile(rotation, width, format)), bytes);
      done.push(width);
      progress(done);
    }
    return done;
  }

  function giveUp(photo: TurnedPhoto): void {
    updatePhotoTurned(database, photo, {
      state: "failed",
      failure: "No pictures could be made of this photo. Delete it and upload it again.",
    });
  }

  queue.register("photo.process", turnedPhoto, makeWebp, { ...options, onFailed: giveUp });
  queue.register("photo.avif", turnedPhoto, makeAvif, options);
  queue.register("photo.clean", z.object({}), () => clean(parts));
}

/** Deletes photos that nothing uses any more and broken uploads, then queues itself for the next day. */
async function clean(parts: PhotoParts & { incoming: Incoming }): Promise<void> {
  const { database, storage, clock, incoming } = parts;
  const batch = 20;
  for (let found = batch; found === batch; ) {
    const unused = database.transaction((tx) => {
      const ids = findUnusedBefore(tx, clock() - unusedForMs, batch);
      for (const id of ids) deletePhotoRow(tx, id);
      return ids;
    });
    for (const id of unused) await storage.removeFolder(`photos/${id}`);
    found = unused.length;
    await nextTurn();
  }
  await incoming.sweep(clock());
  scheduleCleaning(parts);
}

/** Queues the next day's cleaning; calling it again the same day changes nothing. Call it at start. */
export function scheduleCleaning({ queue, clock }: Pick<PhotoParts, "queue" | "clock">): void {
  const day = Math.floor(clock() / dayMs) + 1;
  queue.enqueue("photo.clean", {}, { runAt: day * dayMs, uniqueKey: `photo.clean:${day}` });
}
