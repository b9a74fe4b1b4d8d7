import { useQuery } from "@tanstack/react-query";
import RotateLeft from "lucide-react/icons/rotate-ccw";
import RotateRight from "lucide-react/icons/rotate-cw";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { StoredPhoto } from "#src/components/stored-photo.tsx";
import { BlockStrip, StripButton } from "#src/editor/block-strip.tsx";
import type { PhotoViewProps } from "#src/editor/block-view-props.ts";
import { useApi } from "#src/lib/api.ts";
import { photoQuery, useRotatePhoto } from "../queries.ts";
import { PhotoWords } from "./photo-words.tsx";

/** A photo in the editor: the picture, what can be done with it, and the words that go with it. */
export function EditorPhoto(props: PhotoViewProps) {
  const { attributes, update, remove, move, inGroup, takeOut, joinAbove } = props;
  const { data: photo, error, refetch } = useQuery(photoQuery(useApi(), attributes.photoId));
  const rotate = useRotatePhoto(attributes.photoId);
  const turn = (by: 90 | -90) => rotate.mutate(by);
  const busy = rotate.isPending || photo?.state === "processing";
  return (
    <div contentEditable={false}>
      <BlockStrip what="photo" move={move} remove={remove}>
        <StripButton label="Turn the photo to the left" disabled={busy} onClick={() => turn(-90)}>
          <RotateLeft aria-hidden="true" className="size-5" />
        </StripButton>
        <StripButton label="Turn the photo to the right" disabled={busy} onClick={() => turn(90)}>
          <RotateRight aria-hidden="true" className="size-5" />
        </StripButton>
        {inGroup ? (
          <Button tone="quiet" onClick={takeOut}>
            Set alone
          </Button>
        ) : null}
        {joinAbove ? (
          <Button tone="quiet" onClick={joinAbove}>
            Set beside the photo above
          </Button>
        ) : null}
      </BlockStrip>
      {photo?.state === "failed" ? (
        <Notice kind="error" role="status">
          {photo.failure ?? "The pictures could not be made."} Take the photo out and put it in again.
        </Notice>
      ) : null}
      {error ? (
        <Notice kind="error" actions={<Button onClick={() => void refetch()}>Try again</Button>}>
          The photo could not be fetched. {error.message}
        </Notice>
      ) : null}
      {rotate.error ? <Notice kind="error">{rotate.error.message}</Notice> : null}
      {photo && photo.state !== "failed" ? (
        <StoredPhoto photo={photo} alt={attributes.alt ?? ""} sizes="(min-width: 64rem) 37rem, 100vw" />
      ) : null}
      {!photo && !error ? <div className="aspect-[3/2] w-full animate-scribe rounded bg-grey-wash" /> : null}
      <PhotoWords attributes={attributes} update={update} />
    </div>
  );
}
