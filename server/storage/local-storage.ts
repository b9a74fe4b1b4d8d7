import { mkdir, open, readFile, rename, rm, writeFile } from "node:fs/promises";
import { dirname, join } from "node:path";
import { v7 as uuid } from "uuid";
import type { Storage } from "./storage.ts";

const keyPattern = /^[a-z0-9][a-z0-9-]*(?:[./][a-z0-9][a-z0-9-]*)*$/;

/** Keeps files in a folder of this machine. */
export function createLocalStorage(folder: string): Storage {
  function pathOf(key: string): string {
    if (!keyPattern.test(key)) throw new Error(`Not a storage key: ${key}`);
    return join(folder, key);
  }
  return {
    async write(key, bytes) {
      const path = pathOf(key);
      const half = `${path}.${uuid()}.part`;
      await mkdir(dirname(path), { recursive: true });
      await writeFile(half, bytes);
      await rename(half, path);
    },
    read: async (key) => readFile(pathOf(key)),
    async open(key) {
      const handle = await open(pathOf(key)).catch(missingIsNull);
      if (!handle) return null;
      const { size } = await handle.stat();
      return { bytes: size, stream: handle.createReadStream() };
    },
    removeFolder: async (key) => rm(pathOf(key), { recursive: true, force: true }),
  };
}

function missingIsNull(error: NodeJS.ErrnoException): null {
  if (error.code === "ENOENT") return null;
  throw error;
}
