import { v7 as uuid } from "uuid";
import { describe, expect, it } from "vitest";
import { recordAudit } from "#server/db/audit.ts";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { auditLines } from "#server/db/schema/audit.ts";

describe("recordAudit", () => {
  it("keeps the line with the act, and drops it when the act is rolled back", () => {
    const database = openDatabase(":memory:");
    migrateDatabase(database);
    const line = { at: 5, actorId: uuid(), subjectKind: "entry" as const, subjectId: uuid() };
    database.transaction((tx) =>
      recordAudit(tx, { ...line, action: "entry.publish", detail: { version: 2 } }),
    );
    const failing = () =>
      database.transaction((tx) => {
        recordAudit(tx, { ...line, action: "entry.withdraw" });
        throw new Error("the act failed");
      });
    expect(failing).toThrow("the act failed");
    expect(database.select().from(auditLines).all()).toEqual([
      { ...line, id: expect.any(String), action: "entry.publish", detail: '{"version":2}' },
    ]);
  });
});
