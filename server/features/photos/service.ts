import { rm } from "node:fs/promises";
import { v7 as uuid } from "uuid";
import { recordAudit } from "#server/db/audit.ts";
import type { Connection, Database } from "#server/db/client.ts";
import { AppError, invalidInput } from "#server/http/errors.ts";
import type { Person, Viewer } from "#server/http/viewer.ts";
import type { Queue } from "#server/jobs/queue.ts";
import type { Storage } from "#server/storage/storage.ts";
import { type PhotoView, photoLimits, uploadPhotoFields } from "#shared/contracts/photos.ts";
import { decodeUpload, makeThumbhash, prepareDecoder } from "./image.ts";
import { createOneAtATime } from "./one-at-a-time.ts";
import {
  countLoosePhotos,
  countPhotosOfBuild,
  deletePhotoRow,
  findBuildOwner,
  findPhoto,
  findPhotos,
  findPhotoWithSight,
  insertPhoto,
  isUsed,
  type PhotoRow,
  updatePhoto,
} from "./repository.ts";
import { masterKey, photoView } from "./views.ts";

export interface PhotoParts {
  database: Database;
  queue: Queue;
  storage: Storage;
  clock: () => number;
}

export type PhotoService = ReturnType<typeof createPhotoService>;

/** Portraits a person may have uploaded; the unused ones go by themselves after a few days. */
const mostLoosePhotos = 30;

/** Photos: taken in, turned, shown to those who may see them, deleted. The pictures are made by jobs. */
export function createPhotoService({ database, queue, storage, clock }: PhotoParts) {
  prepareDecoder();
  const decodeInTurn = createOneAtATime();

  function queuePictures(connection: Connection, photo: { id: string; rotation: number }): void {
    queue.enqueue("photo.process", photo, {
      uniqueKey: `photo.process:${photo.id}:${photo.rotation}`,
      connection,
    });
  }

  /** Takes in the uploaded file at `path`, which is gone afterwards whatever happens. */
  async function upload(
    viewer: Person,
    file: { path: string; size: number } | undefined,
    rawFields: unknown,
  ): Promise<PhotoView> {
    try {
      if (!file) throw new AppError("invalid_input", "There is no photo in this upload.", { field: "photo" });
      const fields = uploadPhotoFields.safeParse(rawFields);
      if (!fields.success) throw invalidInput(fields.error);
      const { purpose, build } = fields.data;
      checkPlace(viewer, purpose, build);
      const { master, width, height } = await decodeInTurn(() => decodeUpload(file.path));
      const id = uuid();
      await storage.write(masterKey(id), master);
      const photo: PhotoRow = {
        id,
        ownerId: viewer.id,
        buildId: purpose === "avatar" ? null : (build ?? null),
        purpose,
        state: "processing",
        failure: null,
        width,
        height,
        rotation: 0,
        thumbhash: await makeThumbhash(master, 0),
        webpWidths: "[]",
        avifWidths: "[]",
        bytes: file.size,
        createdAt: clock(),
      };
      database.transaction((tx) => {
        insertPhoto(tx, photo);
        queuePictures(tx, { id, rotation: 0 });
      });
      return photoView(photo);
    } finally {
      if (file) await rm(file.path, { force: true });
    }
  }

  function checkPlace(viewer: Person, purpose: string, build: string | undefined): void {
    if (purpose === "avatar") {
      if (countLoosePhotos(database, viewer.id) < mostLoosePhotos) return;
      throw new AppError("conflict", "You have tried many portraits lately. Try again in a few days.");
    }
    if (!build) {
      throw new AppError("invalid_input", "Say which build the photo belongs to.", { field: "build" });
    }
    if (findBuildOwner(database, build) !== viewer.id) {
      throw new AppError("not_found", "There is no such build in your workshop.");
    }
    if (countPhotosOfBuild(database, build) >= photoLimits.perBuild) {
      throw new AppError(
        "conflict",
        `This build holds ${photoLimits.perBuild} photos, which is the most. Delete some that you do not use.`,
      );
    }
  }

  /** The photo, when this viewer may see it. */
  function find(viewer: Viewer, id: string): { photo: PhotoRow; public: boolean } {
    const found = findPhotoWithSight(database, id);
    if (!found || !(found.public || found.photo.ownerId === viewer?.id)) throw noSuchPhoto();
    return found;
  }

  function findOwn(connection: Connection, viewer: Person, id: string): PhotoRow {
    const photo = findPhoto(connection, id);
    if (photo?.ownerId !== viewer.id) throw noSuchPhoto();
    return photo;
  }

  async function rotate(viewer: Person, id: string, turn: 90 | -90): Promise<PhotoView> {
    const before = findOwn(database, viewer, id);
    const rotation = (before.rotation + turn + 360) % 360;
    const thumbhash = await makeThumbhash(await storage.read(masterKey(id)), rotation);
    return database.transaction((tx) => {
      const { width, height, rotation: present } = findOwn(tx, viewer, id);
      if (present !== before.rotation) {
        throw new AppError("conflict", "This photo is being turned already. Wait a moment.");
      }
      updatePhoto(tx, id, {
        rotation,
        width: height,
        height: width,
        thumbhash,
        state: "processing",
        failure: null,
        webpWidths: "[]",
        avifWidths: "[]",
      });
      queuePictures(tx, { id, rotation });
      return photoView(findOwn(tx, viewer, id));
    });
  }

  async function remove(viewer: Person, id: string): Promise<void> {
    database.transaction((tx) => {
      findOwn(tx, viewer, id);
      if (isUsed(tx, id)) {
        throw new AppError(
          "conflict",
          "This photo is in use. Take it out of the entries that show it first.",
        );
      }
      deletePhotoRow(tx, id);
      recordAudit(tx, {
        at: clock(),
        actorId: viewer.id,
        action: "photo.delete",
        subjectKind: "photo",
        subjectId: id,
      });
    });
    await storage.removeFolder(`photos/${id}`);
  }

  /** The views of many photos at once, by id; ids that are not known are left out. */
  function photoViews(ids: Iterable<string>): Map<string, PhotoView> {
    const wanted = [...new Set(ids)];
    if (wanted.length === 0) return new Map();
    return new Map(findPhotos(database, wanted).map((photo) => [photo.id, photoView(photo)]));
  }

  return { upload, find, rotate, remove, photoViews };
}

function noSuchPhoto(): AppError {
  return new AppError("not_found", "There is no such photo.");
}
