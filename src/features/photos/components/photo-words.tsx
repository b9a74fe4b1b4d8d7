import { clsx } from "clsx";
import type { PhotoAttributes } from "#shared/document/types.ts";
import { CheckboxField } from "#src/components/checkbox-field.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { useOwnText } from "#src/editor/use-own-text.ts";

interface PhotoWordsProps {
  attributes: PhotoAttributes;
  update(changes: Partial<PhotoAttributes>): void;
}

const longestAlt = 500;
const longestCaption = 300;

/** Caption, and the description for those who do not see the photo. It may be left out only on purpose. */
export function PhotoWords({ attributes, update }: PhotoWordsProps) {
  const { alt } = attributes;
  const [caption, setCaption] = useOwnText(attributes.caption, (text) => update({ caption: text }));
  const [shows, setShows] = useOwnText(alt ?? "", (text) =>
    update({ alt: text.trim() === "" ? null : text }),
  );
  const decorative = alt === "";
  return (
    <div
      className={clsx(
        "mt-3 flex flex-col gap-4 border-l-[3px] pl-4",
        alt === null ? "border-straw-fill" : "border-hairline",
      )}
    >
      <TextField
        label="Caption"
        optional
        value={caption}
        error={
          caption.length > longestCaption
            ? `A caption may be at most ${longestCaption} characters.`
            : undefined
        }
        onChange={(event) => setCaption(event.target.value)}
      />
      <div className="flex flex-col gap-1">
        <TextField
          label="What the photo shows"
          help={
            alt === null
              ? "For those who do not see it. Asked for before the entry is published."
              : "For those who do not see it."
          }
          value={shows}
          disabled={decorative}
          error={shows.length > longestAlt ? `This may be at most ${longestAlt} characters.` : undefined}
          onChange={(event) => setShows(event.target.value)}
        />
        <CheckboxField
          label="It is only decoration"
          checked={decorative}
          onChange={(event) => update({ alt: event.target.checked ? "" : shows.trim() || null })}
        />
      </div>
    </div>
  );
}
