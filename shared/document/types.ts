/** A node of a document as JSON, once `validateDocument` has passed it. */
export interface DocumentNode {
  type: string;
  attrs?: Record<string, unknown>;
  content?: DocumentNode[];
  marks?: DocumentMark[];
  text?: string;
}

/** A mark on a piece of text: bold, italic, strike, code or link. */
export interface DocumentMark {
  type: string;
  attrs?: Record<string, unknown>;
}

/**
 * A whole document. The same shape as `documentJson` of the contracts gives, with its nodes named.
 */
export interface RichDocument {
  type: "doc";
  content: DocumentNode[];
}

/** What a photo block keeps. `alt` is null while nothing has been said, and "" for a decorative photo. */
export interface PhotoAttributes {
  photoId: string;
  alt: string | null;
  caption: string;
}

/** What a working block keeps; results are worked out from it, never stored in it. */
export interface WorkingAttributes {
  workingId: string;
  calculator: string;
  title: string;
  inputs: Record<string, unknown>;
}
