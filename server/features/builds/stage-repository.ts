import { and, asc, eq, getTableColumns, isNotNull, isNull, max, or, sql } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { builds, entries, entryPhotos, entryRevisions, stages } from "#server/db/schema/builds.ts";
import { workings } from "#server/db/schema/workings.ts";

type StageRow = typeof stages.$inferSelect;

/** A stage with how many entries a reader, or its builder, finds in it. */
export interface CountedStageRow extends StageRow {
  entryCount: number;
}

/** Which entries count: those that readers see, or all that the builder has. */
export type StageCount = "public" | "all";

function countOf(connection: Connection, which: StageCount) {
  const counted = which === "public" ? eq(entries.state, "public") : isNull(entries.deletedAt);
  const stageOf = which === "public" ? entries.publishedStageId : entries.stageId;
  return connection
    .select({ n: sql<number>`count(*)` })
    .from(entries)
    .where(and(eq(entries.buildId, stages.buildId), eq(stageOf, stages.id), counted));
}

export function listStages(connection: Connection, buildId: string, which: StageCount): CountedStageRow[] {
  return connection
    .select({ ...getTableColumns(stages), entryCount: sql<number>`(${countOf(connection, which)})` })
    .from(stages)
    .where(eq(stages.buildId, buildId))
    .orderBy(asc(stages.position))
    .all();
}

/** A stage with its build's owner. */
export function findStage(connection: Connection, id: string) {
  return connection
    .select({ stage: stages, ownerId: builds.ownerId })
    .from(stages)
    .innerJoin(builds, eq(builds.id, stages.buildId))
    .where(eq(stages.id, id))
    .get();
}

export function insertStageLast(connection: Connection, stage: Omit<StageRow, "position">): void {
  const last = connection
    .select({ position: max(stages.position) })
    .from(stages)
    .where(eq(stages.buildId, stage.buildId))
    .get();
  connection
    .insert(stages)
    .values({ ...stage, position: (last?.position ?? 0) + 1 })
    .run();
}

export function updateStageRow(connection: Connection, id: string, change: Partial<StageRow>): void {
  connection.update(stages).set(change).where(eq(stages.id, id)).run();
}

/** Whether an entry lies in the stage, as a draft or as readers see it. */
export function stageHoldsEntries(connection: Connection, stageId: string): boolean {
  const found = connection
    .select({ id: entries.id })
    .from(entries)
    .where(
      and(
        isNull(entries.deletedAt),
        or(
          eq(entries.stageId, stageId),
          and(isNotNull(entries.publishedStageId), eq(entries.publishedStageId, stageId)),
        ),
      ),
    )
    .get();
  return found !== undefined;
}

/** Deletes a stage, and for good the deleted drafts that still pointed at it. */
export function deleteStageRow(connection: Connection, stageId: string): void {
  const dead = sql`(select ${entries.id} from ${entries} where ${entries.stageId} = ${stageId})`;
  connection.delete(entryRevisions).where(sql`${entryRevisions.entryId} in ${dead}`).run();
  connection.delete(entryPhotos).where(sql`${entryPhotos.entryId} in ${dead}`).run();
  connection.update(workings).set({ entryId: null }).where(sql`${workings.entryId} in ${dead}`).run();
  connection.delete(entries).where(eq(entries.stageId, stageId)).run();
  connection.delete(stages).where(eq(stages.id, stageId)).run();
}

export function setStageOrder(connection: Connection, buildId: string, ids: string[]): void {
  const order = JSON.stringify(ids);
  connection
    .update(stages)
    .set({ position: sql`(select key + 1 from json_each(${order}) where value = ${stages.id})` })
    .where(eq(stages.buildId, buildId))
    .run();
}
