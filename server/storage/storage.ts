import type { Readable } from "node:stream";

/**
 * Where uploaded files lie. Keys are like `photos/<id>/0-480.webp`: small letters, digits, dots, hyphens and
 * single slashes. The local disk is the only kind so far; a bucket would be another.
 */
export interface Storage {
  /** Stores whole files: a reader sees the old bytes or the new ones, never a part. */
  write(key: string, bytes: Buffer): Promise<void>;
  /** Fails when there is no such file. */
  read(key: string): Promise<Buffer>;
  /** For sending; null when there is no such file. */
  open(key: string): Promise<StoredFile | null>;
  /** Removes everything under a folder; fine when there is nothing. */
  removeFolder(key: string): Promise<void>;
}

export interface StoredFile {
  bytes: number;
  stream: Readable;
}
