import { pipeline } from "node:stream/promises";
import { Router } from "express";
import type { Logger } from "pino";
import { AppError } from "#server/http/errors.ts";
import type { Storage } from "#server/storage/storage.ts";
import type { PhotoService } from "./service.ts";
import { pictureKey } from "./views.ts";

const fileName = /^(?:0|90|180|270)-[1-9]\d{0,4}\.(webp|avif)$/;
const uuidShape = /^[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** Serves pictures: for ever cacheable what anyone may see, never kept what only its builder may. */
export function photoFiles({
  photos,
  storage,
  log,
}: {
  photos: PhotoService;
  storage: Storage;
  log: Logger;
}): Router {
  const router = Router();
  router.get("/photos/:photo/:file", async (req, res) => {
    const { photo: id, file } = req.params;
    const [, format] = fileName.exec(file) ?? [];
    if (!format || !uuidShape.test(id)) throw noSuchPicture();
    const found = photos.find(req.viewer, id);
    const stored = await storage.open(pictureKey(id, file));
    if (!stored) throw noSuchPicture();
    res.set({
      "Content-Type": `image/${format}`,
      "Content-Length": String(stored.bytes),
      "Cache-Control": found.public ? "public, max-age=31536000, immutable" : "private, no-store",
      "X-Content-Type-Options": "nosniff",
    });
    if (req.method === "HEAD") {
      stored.stream.destroy();
      res.end();
      return;
    }
    await pipeline(stored.stream, res).catch((error: unknown) =>
      log.debug({ err: error }, "picture not sent"),
    );
  });
  return router;
}

function noSuchPicture(): AppError {
  return new AppError("not_found", "There is no such picture.");
}
