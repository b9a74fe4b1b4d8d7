import type { PhotoView } from "#shared/contracts/photos.ts";
import { Photo, type PhotoSource } from "./photo.tsx";

interface StoredPhotoProps {
  photo: PhotoView | null | undefined;
  alt: string;
  caption?: string;
  /** The CSS `sizes` of the place it stands in. */
  sizes: string;
  priority?: boolean;
  crop?: "3/2" | "1/1";
  className?: string;
}

/** A stored photo with its files to choose from; while they are being made, a place of its shape. */
export function StoredPhoto({ photo, alt, caption, sizes, priority, crop, className }: StoredPhotoProps) {
  const fallback = photo?.webp.find((file) => file.width >= 960) ?? photo?.webp.at(-1);
  if (!photo || !fallback) return <PhotoNotReady photo={photo} alt={alt} caption={caption} />;
  return (
    <Photo
      src={fallback.url}
      alt={alt}
      width={photo.width}
      height={photo.height}
      sources={sourcesOf(photo)}
      sizes={sizes}
      {...(photo.placeholder && { thumbhash: photo.placeholder })}
      {...(caption && { caption })}
      {...(priority && { priority })}
      {...(crop && { crop })}
      {...(className && { className })}
    />
  );
}

/**
 * AVIF is not made at the largest width. A browser takes the first source whose type it knows, so that
 * width's WebP stands in the same list: whoever reads AVIF reads WebP.
 */
function sourcesOf({ webp, avif }: PhotoView): PhotoSource[] {
  const files = (sources: PhotoView["webp"]) => sources.map(({ url, width }) => ({ src: url, width }));
  const everyWidth: PhotoSource = { type: "image/webp", files: files(webp) };
  if (avif.length === 0) return [everyWidth];
  const larger = webp.filter(({ width }) => !avif.some((file) => file.width === width));
  return [{ type: "image/avif", files: files([...avif, ...larger]) }, everyWidth];
}

function PhotoNotReady({ photo, alt, caption }: Pick<StoredPhotoProps, "photo" | "alt" | "caption">) {
  const coming = photo?.state === "processing";
  return (
    <figure className="not-prose">
      <div
        className="grid min-h-40 w-full place-content-center border border-dashed border-edge p-6 text-center font-sans text-sm text-ink-soft sm:rounded"
        style={photo ? { aspectRatio: `${photo.width} / ${photo.height}` } : undefined}
      >
        <p className="font-semibold">
          {coming
            ? "This photo is being made ready. Look again in a minute."
            : "This photo is not here any more."}
        </p>
        {alt ? <p className="mt-1">It shows: {alt}</p> : null}
      </div>
      {caption ? <figcaption className="mt-2 font-sans text-xs text-ink-soft">{caption}</figcaption> : null}
    </figure>
  );
}
