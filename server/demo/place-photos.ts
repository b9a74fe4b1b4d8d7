import type { DocumentNode, RichDocument } from "#shared/document/types.ts";
import { type PhotoName, photoAlts } from "./photos.ts";

/** The document of a demo entry, with the stored photos' ids and descriptions in place of their names. */
export function placePhotos(
  content: readonly DocumentNode[],
  idOf: (name: PhotoName) => string,
): RichDocument {
  const place = (node: DocumentNode): DocumentNode => {
    if (node.type === "photo") {
      const name = node.attrs?.photoId as PhotoName;
      return { ...node, attrs: { ...node.attrs, photoId: idOf(name), alt: photoAlts[name] } };
    }
    return node.content ? { ...node, content: node.content.map(place) } : node;
  };
  return { type: "doc", content: content.map(place) };
}

/** The names of the photos an entry shows, each once. */
export function photosOf(content: readonly DocumentNode[]): PhotoName[] {
  const names = content.flatMap((node): PhotoName[] =>
    node.type === "photo" ? [node.attrs?.photoId as PhotoName] : photosOf(node.content ?? []),
  );
  return [...new Set(names)];
}
