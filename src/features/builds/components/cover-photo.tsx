import type { PhotoView } from "#shared/contracts/photos.ts";

interface CoverPhotoProps {
  photo: PhotoView | null;
  alt: string;
  /** The CSS `sizes` of the place it stands in. */
  sizes: string;
}

/** A cover in a 3:2 frame; while its pictures are being made, the placeholder. */
export function CoverPhoto({ photo, alt, sizes }: CoverPhotoProps) {
  const pictures = photo?.webp ?? [];
  const largest = pictures.at(-1);
  const background = photo?.placeholder ? { backgroundImage: `url(${photo.placeholder})` } : undefined;
  if (!largest) {
    return (
      <div
        aria-hidden="true"
        style={background}
        className="grid aspect-[3/2] w-full place-content-center rounded bg-grey-wash bg-cover"
      >
        {photo ? null : <LayoutCross />}
      </div>
    );
  }
  return (
    <img
      src={largest.url}
      srcSet={pictures.map(({ url, width }) => `${url} ${width}w`).join(", ")}
      sizes={sizes}
      alt={alt}
      style={background}
      loading="lazy"
      decoding="async"
      className="aspect-[3/2] w-full rounded bg-grey-wash bg-cover object-cover"
    />
  );
}

/** Centre lines waiting for something to be laid out on them. */
function LayoutCross() {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 48 48"
      className="size-12 text-edge"
      fill="none"
      stroke="currentColor"
    >
      <path d="M24 2v44M2 24h44" strokeWidth="1" strokeDasharray="12 3 3 3" />
      <circle cx="24" cy="24" r="9" strokeWidth="1.5" />
    </svg>
  );
}
