import { crc32, deflateSync } from "node:zlib";
import sharp from "sharp";

type Bytes = Uint8Array<ArrayBuffer>;

const own = (buffer: Buffer): Bytes => Uint8Array.from(buffer);

interface Size {
  width: number;
  height: number;
}

/** A picture with a red left half and a blue right half, so that a turn shows. */
function halves({ width, height }: Size) {
  const left = Math.floor(width / 2);
  return sharp({ create: { width, height, channels: 3, background: { r: 20, g: 40, b: 220 } } }).composite([
    {
      input: { create: { width: left, height, channels: 3, background: { r: 220, g: 30, b: 20 } } },
      left: 0,
      top: 0,
    },
  ]);
}

export async function jpeg(size: Size = { width: 1200, height: 800 }): Promise<Bytes> {
  return own(await halves(size).jpeg().toBuffer());
}

export async function png(size: Size = { width: 1200, height: 800 }): Promise<Bytes> {
  return own(await halves(size).png().toBuffer());
}

export async function avif(size: Size = { width: 64, height: 48 }): Promise<Bytes> {
  return own(await halves(size).avif({ effort: 0 }).toBuffer());
}

/** A phone's photo: place, maker and owner in its EXIF, and the turn that says which way up it is. */
export async function phonePhoto(size: Size, orientation: number): Promise<Bytes> {
  const photo = halves(size)
    .jpeg()
    .withMetadata({ orientation })
    .withExifMerge({
      IFD0: { Artist: "LOWBARN-OWNER", Make: "LOWBARN-PHONE" },
      IFD3: {
        GPSLatitudeRef: "N",
        GPSLatitude: "51/1 30/1 3230/100",
        GPSLongitudeRef: "W",
        GPSLongitude: "0/1 7/1 4366/100",
      },
    });
  return own(await photo.toBuffer());
}

/** Two frames that differ, one above the other. */
export async function movingWebp(): Promise<Bytes> {
  const frames = Buffer.concat([Buffer.alloc(16 * 16 * 3, 30), Buffer.alloc(16 * 16 * 3, 200)]);
  const moving = sharp(frames, { raw: { width: 16, height: 32, channels: 3, pageHeight: 16 } }).webp({
    loop: 0,
    delay: [100, 100],
  });
  return own(await moving.toBuffer());
}

/** A PNG whose header names its size but which holds no picture (ISO/IEC 15948: signature, IHDR, IDAT, IEND). */
export function pngOfSize({ width, height }: Size): Bytes {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([8, 2, 0, 0, 0], 8);
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return own(
    Buffer.concat([
      signature,
      chunk("IHDR", header),
      chunk("IDAT", deflateSync(Buffer.alloc(1))),
      chunk("IEND", Buffer.alloc(0)),
    ]),
  );
}

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, "latin1"), data]);
  const out = Buffer.alloc(body.length + 8);
  out.writeUInt32BE(data.length, 0);
  body.copy(out, 4);
  out.writeUInt32BE(crc32(body), body.length + 4);
  return out;
}

/** The first bytes of a HEVC still picture: the brand `heic` of ISO/IEC 23008-12. */
export function heic(): Bytes {
  const box = Buffer.alloc(400);
  box.writeUInt32BE(24, 0);
  box.write("ftypheic", 4, "latin1");
  box.write("mif1heic", 16, "latin1");
  return own(box);
}
