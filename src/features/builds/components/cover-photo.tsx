import type { PhotoView } from "#shared/contracts/photos.ts";
import { placeholderBackground } from "#src/components/placeholder-background.ts";
import { StoredPhoto } from "#src/components/stored-photo.tsx";

interface CoverPhotoProps {
  photo: PhotoView | null;
  alt: string;
  /** The CSS `sizes` of the place it stands in. */
  sizes: string;
}

/** A cover in a 3:2 frame; while its pictures are being made, the placeholder. */
export function CoverPhoto({ photo, alt, sizes }: CoverPhotoProps) {
  if (photo && photo.webp.length > 0) return <StoredPhoto photo={photo} alt={alt} sizes={sizes} crop="3/2" />;
  return (
    <div
      aria-hidden="true"
      style={photo?.placeholder ? placeholderBackground(photo.placeholder) : undefined}
      className="grid aspect-[3/2] w-full place-content-center rounded bg-grey-wash"
    >
      {photo ? null : <LayoutCross />}
    </div>
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
