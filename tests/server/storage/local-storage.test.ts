import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { text } from "node:stream/consumers";
import { describe, expect, it, onTestFinished } from "vitest";
import { createLocalStorage } from "#server/storage/local-storage.ts";

function freshFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), "soapstone-"));
  onTestFinished(() => rmSync(folder, { recursive: true }));
  return folder;
}

describe("createLocalStorage", () => {
  it("gives back what was written, and leaves no half file beside it", async () => {
    const folder = freshFolder();
    const storage = createLocalStorage(folder);
    await storage.write("photos/a1/0-480.webp", Buffer.from("first"));
    await storage.write("photos/a1/0-480.webp", Buffer.from("second"));
    expect((await storage.read("photos/a1/0-480.webp")).toString()).toBe("second");
    const file = await storage.open("photos/a1/0-480.webp");
    expect(file?.bytes).toBe(6);
    expect(file && (await text(file.stream))).toBe("second");
    expect(readdirSync(join(folder, "photos/a1"))).toEqual(["0-480.webp"]);
  });

  it("answers null for a file that is not there, and fails to read it", async () => {
    const storage = createLocalStorage(freshFolder());
    expect(await storage.open("photos/a1/master")).toBeNull();
    await expect(storage.read("photos/a1/master")).rejects.toThrow("ENOENT");
  });

  it("removes a folder, and is content when there is none", async () => {
    const storage = createLocalStorage(freshFolder());
    await storage.write("photos/a1/master", Buffer.from("x"));
    await storage.removeFolder("photos/a1");
    await storage.removeFolder("photos/a1");
    expect(await storage.open("photos/a1/master")).toBeNull();
  });

  it.each(["../secret", "photos/../../secret", "/etc/passwd", "photos//a", "photos/.hidden", "", "Photos/a"])(
    "refuses the key %j",
    async (key) => {
      const storage = createLocalStorage(freshFolder());
      await expect(storage.read(key)).rejects.toThrow("Not a storage key");
      await expect(storage.write(key, Buffer.from("x"))).rejects.toThrow("Not a storage key");
    },
  );
});
