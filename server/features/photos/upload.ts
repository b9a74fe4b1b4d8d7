import { mkdirSync } from "node:fs";
import { readdir, rm, stat } from "node:fs/promises";
import { join } from "node:path";
import type { RequestHandler } from "express";
import multer, { MulterError } from "multer";
import { v7 as uuid } from "uuid";
import { AppError } from "#server/http/errors.ts";
import { photoLimits } from "#shared/contracts/photos.ts";

const leftBehindMs = 3600_000;

/** Where uploads wait for the moment it takes to decode them; what a broken connection left there is swept out. */
export function createIncoming(folder: string) {
  mkdirSync(folder, { recursive: true });
  const storage = multer.diskStorage({
    destination: folder,
    filename: (_req, _file, done) => done(null, uuid()),
  });
  const limits = { fileSize: photoLimits.bytes, files: 1, fields: 4, fieldSize: 200, parts: 6 };
  const parse = multer({ storage, limits }).single("photo");

  /** Takes one file in the field `photo` to disk. Its name is not looked at. */
  const receive: RequestHandler = (req, res, next) => {
    parse(req, res, (error: unknown) => next(error instanceof MulterError ? explain(error) : error));
  };

  async function sweep(now: number): Promise<void> {
    for (const name of await readdir(folder)) {
      const path = join(folder, name);
      const { mtimeMs } = await stat(path);
      if (mtimeMs < now - leftBehindMs) await rm(path, { force: true });
    }
  }

  return { receive, sweep };
}

export type Incoming = ReturnType<typeof createIncoming>;

function explain({ code }: MulterError): AppError {
  if (code === "LIMIT_FILE_SIZE") {
    const megabytes = photoLimits.bytes / 1024 / 1024;
    return new AppError(
      "too_large",
      `This photo is larger than ${megabytes} MB. Save a smaller copy and upload that.`,
    );
  }
  if (code === "LIMIT_FILE_COUNT" || code === "LIMIT_UNEXPECTED_FILE") {
    return new AppError("invalid_input", "Send one photo at a time, in the field photo.");
  }
  return new AppError("invalid_input", "The upload could not be read. Try it again.");
}
