import { createContext, useContext } from "react";
import type { EntryPage, WorkingView } from "#shared/contracts/entries.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import { photosIn, workingsIn } from "#shared/document/read.ts";

/** What stands in an entry beside its words, as the blocks of its document find it. */
export interface EntryMedia {
  photos: Record<string, PhotoView>;
  workings: Record<string, WorkingView>;
  /** Where a photo first stands in the entry, counted from 1. */
  photoNumbers: Map<string, number>;
}

export function entryMedia({
  document,
  photos,
  workings,
}: Pick<EntryPage, "document" | "photos" | "workings">): EntryMedia {
  const ids = [...new Set(photosIn(document).map((photo) => photo.photoId))];
  return { photos, workings, photoNumbers: new Map(ids.map((id, index) => [id, index + 1])) };
}

/** The workings of an entry in reading order. */
export function workingsInOrder({ document, workings }: EntryPage): WorkingView[] {
  return workingsIn(document).flatMap(({ workingId }) => workings[workingId] ?? []);
}

/** The place of a working on its entry's page. */
export const workingAnchor = (number: number) => `w${number}`;

const EntryMediaContext = createContext<EntryMedia | null>(null);

export const EntryMediaProvider = EntryMediaContext.Provider;

export function useEntryMedia(): EntryMedia {
  const media = useContext(EntryMediaContext);
  if (!media) throw new Error("An entry's blocks are shown outside EntryMediaProvider");
  return media;
}
