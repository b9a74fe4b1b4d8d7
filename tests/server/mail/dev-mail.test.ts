import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pino } from "pino";
import { describe, expect, it, onTestFinished } from "vitest";
import { createApp } from "#server/app.ts";
import { readConfig } from "#server/config/environment.ts";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";

async function statusOfDevMail(fakes: "true" | "false"): Promise<number> {
  const folder = mkdtempSync(join(tmpdir(), "soapstone-fakes-"));
  const config = readConfig({ NODE_ENV: "test", UPLOADS_DIR: folder, FAKES: fakes, DEMO: "false" });
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  const { app } = createApp({ config, database, log: pino({ level: "silent" }), clock: Date.now });
  const server = app.listen(0, "127.0.0.1");
  await once(server, "listening");
  onTestFinished(() => {
    server.closeAllConnections();
    server.close();
    database.$client.close();
    rmSync(folder, { recursive: true });
  });
  const { port } = server.address() as AddressInfo;
  return (await fetch(`http://127.0.0.1:${port}/dev/mail`)).status;
}

describe("createApp", () => {
  it("has /dev/mail only while the fakes are on", async () => {
    expect(await statusOfDevMail("true")).toBe(200);
    expect(await statusOfDevMail("false")).toBe(404);
  });
});
