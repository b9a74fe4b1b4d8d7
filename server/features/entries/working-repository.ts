import { eq, inArray, sql } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { builds } from "#server/db/schema/builds.ts";
import { workings } from "#server/db/schema/workings.ts";

export type WorkingRow = typeof workings.$inferSelect;

export function findWorkings(connection: Connection, ids: string[]): WorkingRow[] {
  if (ids.length === 0) return [];
  return connection.select().from(workings).where(inArray(workings.id, ids)).all();
}

export function workingsOfEntry(connection: Connection, entryId: string): WorkingRow[] {
  return connection.select().from(workings).where(eq(workings.entryId, entryId)).all();
}

/** Takes the next numbers of the build, so that none is ever given twice; returns the first. */
export function takeWorkingNumbers(connection: Connection, buildId: string, count: number): number {
  const taken = connection
    .update(builds)
    .set({ lastWorkingNumber: sql`${builds.lastWorkingNumber} + ${count}` })
    .where(eq(builds.id, buildId))
    .returning({ last: builds.lastWorkingNumber })
    .get();
  if (!taken) throw new Error(`No build ${buildId}`);
  return taken.last - count + 1;
}

/** Adds workings, and brings those that are there up to date. */
export function putWorkings(connection: Connection, rows: (typeof workings.$inferInsert)[]): void {
  if (rows.length === 0) return;
  connection
    .insert(workings)
    .values(rows)
    .onConflictDoUpdate({
      target: workings.id,
      set: {
        calculator: sql`excluded.calculator`,
        title: sql`excluded.title`,
        version: sql`excluded.version`,
        inputs: sql`excluded.inputs`,
        results: sql`excluded.results`,
        updatedAt: sql`excluded.updated_at`,
      },
    })
    .run();
}

/** Lets readers see these workings of the entry as they now are, and none of its others. */
export function publishWorkings(connection: Connection, entryId: string, ids: string[]): void {
  const { title, calculator, version, inputs, results } = workings;
  const shown = JSON.stringify(ids);
  const snapshot = sql`json_object('title', ${title}, 'calculator', ${calculator}, 'version', ${version},
    'inputs', json(${inputs}), 'results', json(${results}))`;
  connection
    .update(workings)
    .set({
      published: sql`case when ${workings.id} in (select value from json_each(${shown})) then ${snapshot} end`,
    })
    .where(eq(workings.entryId, entryId))
    .run();
}
