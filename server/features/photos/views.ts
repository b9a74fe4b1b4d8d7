import { type PhotoView, photoWidths } from "#shared/contracts/photos.ts";
import type { PictureFormat } from "./image.ts";
import type { PhotoRow } from "./repository.ts";

/** The widths made of a photo: those it is wide enough for, and its own when it is less than the largest. */
export function widthsFor(width: number): number[] {
  const fitting: number[] = photoWidths.filter((each) => each <= width);
  return fitting.length < photoWidths.length && !fitting.includes(width) ? [...fitting, width] : fitting;
}

export function masterKey(id: string): string {
  return `photos/${id}/master`;
}

export function pictureKey(id: string, file: string): string {
  return `photos/${id}/${file}`;
}

/** The name says the turn and the width, so that what lies under an address never changes. */
export function pictureFile(rotation: number, width: number, format: PictureFormat): string {
  return `${rotation}-${width}.${format}`;
}

/** A photo as pages need it. */
export function photoView(photo: PhotoRow): PhotoView {
  const files = (widths: string, format: PictureFormat) =>
    (JSON.parse(widths) as number[]).map((width) => ({
      width,
      url: `/photos/${photo.id}/${pictureFile(photo.rotation, width, format)}`,
    }));
  return {
    id: photo.id,
    state: photo.state,
    failure: photo.failure,
    width: photo.width,
    height: photo.height,
    rotation: photo.rotation as PhotoView["rotation"],
    placeholder: photo.thumbhash,
    webp: files(photo.webpWidths, "webp"),
    avif: files(photo.avifWidths, "avif"),
  };
}
