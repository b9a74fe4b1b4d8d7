import type { CSSProperties } from "react";
import type { PhotoView } from "#shared/contracts/photos.ts";
import type { PhotoAttributes } from "#shared/document/types.ts";
import { MarginRow } from "#src/components/margin-row.tsx";
import { StoredPhoto } from "#src/components/stored-photo.tsx";
import { useEntryMedia } from "../entry-media.ts";

/** The photo is at most 1.4 columns wide. */
const wide = "(min-width: 78rem) 51.3rem, (min-width: 60rem) calc(100vw - 17rem), 100vw";

const shapeOf = (photo: PhotoView | undefined) => (photo ? photo.width / photo.height : 1.5);

const withShape = (photo: PhotoView | undefined) => ({ "--shape": shapeOf(photo) }) as CSSProperties;

/** A photo with its number in the margin and its caption under it. */
export function PhotoBlock({ photoId, alt, caption }: PhotoAttributes) {
  const { photos, photoNumbers } = useEntryMedia();
  const number = photoNumbers.get(photoId);
  return (
    <MarginRow wide notes={<span>Photo {number}</span>}>
      <div className="photo-single" style={withShape(photos[photoId])}>
        <StoredPhoto
          photo={photos[photoId]}
          alt={alt ?? ""}
          caption={caption}
          sizes={wide}
          priority={number === 1}
        />
      </div>
    </MarginRow>
  );
}

/** Two to six photos together, in rows of two or three of one height. */
export function PhotoGroupBlock({ photos: group }: { photos: PhotoAttributes[] }) {
  const { photos, photoNumbers } = useEntryMedia();
  const numbers = group.map(({ photoId }) => photoNumbers.get(photoId) ?? 0);
  const label = `Photos ${Math.min(...numbers)} to ${Math.max(...numbers)}`;
  return (
    <MarginRow wide notes={<span>{label}</span>}>
      <div className="flex flex-col gap-3">
        {rowsOf(group).map((row) => (
          <div key={row[0]?.photoId} className="photo-row">
            {row.map(({ photoId, alt, caption }) => (
              <div key={photoId} style={withShape(photos[photoId])}>
                <StoredPhoto
                  photo={photos[photoId]}
                  alt={alt ?? ""}
                  caption={caption}
                  sizes={`(min-width: 78rem) ${Math.round(51 / row.length)}rem, (min-width: 40rem) ${Math.round(100 / row.length)}vw, 100vw`}
                  priority={photoNumbers.get(photoId) === 1}
                />
              </div>
            ))}
          </div>
        ))}
      </div>
    </MarginRow>
  );
}

/** Up to three in a row; four and five begin with a row of two. */
export function rowsOf<Item>(group: Item[]): Item[][] {
  const first = group.length <= 3 || group.length === 6 ? 3 : 2;
  const rows = [group.slice(0, first), group.slice(first)];
  return rows.filter((row) => row.length > 0);
}
