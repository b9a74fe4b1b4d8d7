import { open } from "node:fs/promises";
import sharp, { type Metadata, type Sharp } from "sharp";
import { rgbaToThumbHash } from "thumbhash";
import { AppError } from "#server/http/errors.ts";
import { photoLimits } from "#shared/contracts/photos.ts";

/** A photo as it was decoded: upright, without any metadata, with nothing left of the uploaded file but its pixels. */
export interface CleanPhoto {
  master: Buffer;
  width: number;
  height: number;
}

export type PictureFormat = "webp" | "avif";

const readable = ["jpeg", "png", "webp", "heif"];
const longestToShortest = 10;

/**
 * Sets the decoder up for this process: only four kinds of picture are decoded at all, whatever a file is
 * called, and each on one thread, so that the thread of the requests keeps a core.
 */
export function prepareDecoder(): void {
  sharp.block({ operation: ["VipsForeignLoad"] });
  sharp.unblock({
    operation: ["VipsForeignLoadJpeg", "VipsForeignLoadPng", "VipsForeignLoadWebp", "VipsForeignLoadHeif"],
  });
  sharp.concurrency(1);
  sharp.cache(false);
}

/** Decodes an uploaded file into a clean photo, or says what is wrong with it. */
export async function decodeUpload(path: string): Promise<CleanPhoto> {
  // The header is read without the limit, so that the refusal can say how large the picture is.
  const metadata = await sharp(path, { limitInputPixels: false })
    .metadata()
    .catch(() => null);
  if (!metadata) throw (await isHeic(path)) ? heic() : unreadable();
  refuseUnfit(metadata);
  const picture = sharp(path, { failOn: "error", limitInputPixels: photoLimits.pixels });
  const upright = picture.autoOrient();
  // Transparency is kept; anything else becomes a fine JPEG, small enough to keep for later turns.
  const kept = metadata.hasAlpha ? upright.png() : upright.jpeg({ quality: 92 });
  try {
    const { data, info } = await kept.toBuffer({ resolveWithObject: true });
    return { master: data, width: info.width, height: info.height };
  } catch {
    throw damaged();
  }
}

function refuseUnfit({ format, compression, pages = 1, width, height }: Metadata): void {
  if (!readable.includes(format)) throw unreadable();
  if (format === "heif" && compression !== "av1") throw heic();
  if (pages > 1) {
    throw new AppError("unsupported_media", "This picture moves. Upload a still picture instead.");
  }
  if (width * height > photoLimits.pixels) {
    const millions = (pixels: number) => Math.round(pixels / 1e6);
    throw new AppError(
      "too_large",
      `This photo has ${millions(width * height)} million pixels; ${millions(photoLimits.pixels)} million are the most. Save a smaller copy and upload that.`,
    );
  }
  if (Math.max(width, height) > longestToShortest * Math.min(width, height)) {
    throw new AppError(
      "invalid_input",
      `This picture is more than ${longestToShortest} times as long as it is wide. Crop it and upload it again.`,
    );
  }
}

/** The brand in the first bytes of an ISO base media file (ISO/IEC 14496-12, 4.3); the HEVC ones are in ISO/IEC 23008-12. */
async function isHeic(path: string): Promise<boolean> {
  const file = await open(path);
  try {
    const { buffer } = await file.read(Buffer.alloc(12), 0, 12, 0);
    const start = buffer.toString("latin1");
    return /^ftyp(?:hei[cxms]|hev[cxms]|mif1|msf1)$/.test(start.slice(4));
  } finally {
    await file.close();
  }
}

function heic(): AppError {
  return new AppError(
    "unsupported_media",
    "This is a HEIC photo, which most browsers cannot show. Save or share it as a JPEG and upload that. On a phone, the camera setting for the most compatible format makes JPEGs from the start.",
  );
}

function unreadable(): AppError {
  return new AppError(
    "unsupported_media",
    "This file is not a photo that can be read here. Upload a JPEG, PNG, WebP or AVIF picture.",
  );
}

function damaged(): AppError {
  return new AppError(
    "unsupported_media",
    "This photo is damaged or cut short. Copy it from the camera again, then upload it.",
  );
}

/** A few bytes from which a blurred stand-in is drawn, for the photo as turned. */
export async function makeThumbhash(master: Buffer, rotation: number): Promise<string> {
  const { data, info } = await sharp(master)
    .rotate(rotation)
    .resize(100, 100, { fit: "inside" })
    .ensureAlpha()
    .raw()
    .toBuffer({ resolveWithObject: true });
  return Buffer.from(rgbaToThumbHash(info.width, info.height, data)).toString("base64");
}

/** Pixels of a photo, turned and at the largest width that is made of it: decoded once for all its pictures. */
export interface Pixels {
  data: Buffer;
  raw: { width: number; height: number; channels: 1 | 2 | 3 | 4 };
}

/** Never larger than the photo. */
export async function decodeMaster(
  master: Buffer,
  { rotation, width }: { rotation: number; width: number },
): Promise<Pixels> {
  const { data, info } = await sharp(master)
    .rotate(rotation)
    .resize({ width, withoutEnlargement: true })
    .toColourspace("srgb")
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data, raw: { width: info.width, height: info.height, channels: info.channels } };
}

/** One picture of a photo, `width` pixels wide. */
export function makePicture(
  { data, raw }: Pixels,
  { width, format }: { width: number; format: PictureFormat },
): Promise<Buffer> {
  const picture = sharp(data, { raw });
  return encode(raw.width > width ? picture.resize({ width }) : picture, format).toBuffer();
}

function encode(picture: Sharp, format: PictureFormat): Sharp {
  // Effort 3: a quarter of the time of the default 4 at about the same size.
  return format === "webp" ? picture.webp({ quality: 80 }) : picture.avif({ quality: 55, effort: 3 });
}
