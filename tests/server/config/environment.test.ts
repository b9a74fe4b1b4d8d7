import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { readConfig } from "#server/config/environment.ts";

const folder = () => mkdtempSync(join(tmpdir(), "soapstone-config-"));

describe("readConfig", () => {
  it("needs nothing set", () => {
    const config = readConfig({ UPLOADS_DIR: folder() });
    expect(config).toMatchObject({ PORT: 3000, SITE_URL: "http://localhost:3000", FAKES: true });
  });

  it("names a wrong variable and says why", () => {
    expect(() => readConfig({ UPLOADS_DIR: folder(), PORT: "many" })).toThrow(/PORT/);
  });

  it("keeps the secret it made, so that sessions outlive a restart", () => {
    const UPLOADS_DIR = folder();
    expect(readConfig({ UPLOADS_DIR }).SESSION_SECRET).toBe(readConfig({ UPLOADS_DIR }).SESSION_SECRET);
  });
});
