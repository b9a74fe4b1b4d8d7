import { useQueryClient } from "@tanstack/react-query";
import { type ChangeEvent, type RefObject, useEffect, useRef, useState } from "react";
import { v4 as uuid } from "uuid";
import type { PhotoView } from "#shared/contracts/photos.ts";
import type { DocumentNode } from "#shared/document/types.ts";
import type { EditorHandle } from "#src/editor/editor-handle.ts";
import { uploadPhoto } from "#src/lib/upload.ts";
import { UploadCards } from "./components/upload-cards.tsx";
import { photoKey } from "./queries.ts";
import { UploadQueue } from "./upload-queue.ts";

const mostInGroup = 6;

interface Batch {
  side: "alone" | "group";
  /** Photos of a group that are across and wait for the others. */
  arrived: DocumentNode[];
}

/**
 * Brings photos into the text: chosen, taken, pasted or dropped. Each stands where it was put in as soon as it is on
 * the server; those of a group come in together.
 */
export function usePhotoUploads(build: string, editor: RefObject<EditorHandle | null>) {
  const queryClient = useQueryClient();
  const [batches] = useState(() => new Map<string, Batch>());
  const chooser = useRef<HTMLInputElement>(null);
  const camera = useRef<HTMLInputElement>(null);
  const wanted = useRef<Batch["side"]>("alone");
  const [queue] = useState(
    () =>
      new UploadQueue({
        send: (file, onProgress, signal) =>
          uploadPhoto({ file, purpose: "entry", buildId: build, onProgress, signal }),
        newId: uuid,
        onDone: ({ place }, photo) => arrive(place, photo),
      }),
  );

  function arrive(place: string, photo: PhotoView): void {
    queryClient.setQueryData(photoKey(photo.id), photo);
    const batch = batches.get(place);
    const block = photoBlock(photo.id);
    if (batch?.side === "group") batch.arrived.push(block);
    else editor.current?.fillPlace(place, [block]);
  }

  // Once nothing is under way for a place any more, its group is put in and the place closed.
  useEffect(() => {
    const settle = () => {
      for (const [place, batch] of batches) {
        if (queue.uploads().some((upload) => upload.place === place)) continue;
        batches.delete(place);
        if (batch.arrived.length > 0) editor.current?.fillPlace(place, groupsOf(batch.arrived));
        editor.current?.closePlace(place);
      }
    };
    // After the photo that has just arrived has been taken in.
    return queue.subscribe(() => queueMicrotask(settle));
  }, [queue, batches, editor]);
  useEffect(() => () => queue.cancelAll(), [queue]);

  const bring = (files: File[], at?: number, side: Batch["side"] = "alone") => {
    const place = editor.current?.openPlace(at);
    if (!place || files.length === 0) return;
    batches.set(place, { side, arrived: [] });
    queue.add(files, place);
  };
  const taken = ({ target }: ChangeEvent<HTMLInputElement>) => {
    bring([...(target.files ?? [])], undefined, wanted.current);
    target.value = "";
  };
  return {
    bring,
    choose: (kind: "photos" | "group" | "camera") => {
      wanted.current = kind === "group" ? "group" : "alone";
      (kind === "camera" ? camera : chooser).current?.click();
    },
    renderPlace: (place: string) => <UploadCards queue={queue} place={place} />,
    busy: () => queue.uploads().length > 0,
    inputs: (
      <>
        <input
          ref={chooser}
          type="file"
          multiple
          accept="image/*,.heic,.heif"
          aria-label="Choose photos"
          hidden
          onChange={taken}
        />
        <input
          ref={camera}
          type="file"
          accept="image/*"
          capture="environment"
          aria-label="Take a photo"
          hidden
          onChange={taken}
        />
      </>
    ),
  };
}

function photoBlock(photoId: string): DocumentNode {
  return { type: "photo", attrs: { photoId, alt: null, caption: "" } };
}

/** Photos in groups of two to six, as even as can be; a single one stays alone. */
export function groupsOf(photos: DocumentNode[]): DocumentNode[] {
  if (photos.length < 2) return photos;
  const count = Math.ceil(photos.length / mostInGroup);
  const startOf = (group: number) => Math.floor((group * photos.length) / count);
  return Array.from({ length: count }, (_, group) => ({
    type: "photoGroup",
    content: photos.slice(startOf(group), startOf(group + 1)),
  }));
}
