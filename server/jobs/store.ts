import { and, asc, count, eq, inArray, lte, or, sql } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { jobs } from "#server/db/schema/jobs.ts";

export type Job = typeof jobs.$inferSelect;

/** Adds a job; does nothing when one with the same key still waits or runs. */
export function insertJob(connection: Connection, job: typeof jobs.$inferInsert): void {
  connection.insert(jobs).values(job).onConflictDoNothing({ target: jobs.uniqueKey }).run();
}

/**
 * Takes the job that has been due longest and leases it, in one statement, so that two processes never
 * take the same one. A job whose lease ran out (its process died) is due again.
 */
export function leaseDueJob(
  connection: Connection,
  { kind, now, leaseMs }: { kind: string; now: number; leaseMs: number },
): Job | undefined {
  const due = connection
    .select({ id: jobs.id })
    .from(jobs)
    .where(
      and(
        eq(jobs.kind, kind),
        or(
          and(eq(jobs.state, "queued"), lte(jobs.runAt, now)),
          and(eq(jobs.state, "running"), lte(jobs.leasedUntil, now)),
        ),
      ),
    )
    .orderBy(asc(jobs.runAt), asc(jobs.id))
    .limit(1);
  return connection
    .update(jobs)
    .set({ state: "running", leasedUntil: now + leaseMs, attempts: sql`${jobs.attempts} + 1` })
    .where(inArray(jobs.id, due))
    .returning()
    .get();
}

/** Only the holder of the present lease may write a job's outcome: each lease has its own attempt number. */
function heldLease(job: Job) {
  return and(eq(jobs.id, job.id), eq(jobs.state, "running"), eq(jobs.attempts, job.attempts));
}

/** Marks a job done. Its payload goes: letters carry one-time links, which nobody needs again. */
export function markDone(connection: Connection, job: Job, now: number): void {
  connection
    .update(jobs)
    .set({ state: "done", payload: "{}", uniqueKey: null, leasedUntil: null, finishedAt: now })
    .where(heldLease(job))
    .run();
}

export function markForRetry(connection: Connection, job: Job, runAt: number, lastError: string): void {
  connection
    .update(jobs)
    .set({ state: "queued", runAt, leasedUntil: null, lastError })
    .where(heldLease(job))
    .run();
}

export function markFailed(connection: Connection, job: Job, now: number, lastError: string): void {
  connection
    .update(jobs)
    .set({ state: "failed", uniqueKey: null, leasedUntil: null, finishedAt: now, lastError })
    .where(heldLease(job))
    .run();
}

/** Deletes the record of jobs that were done before a moment; failed ones stay to be looked at. */
export function forgetDone(connection: Connection, before: number): void {
  connection
    .delete(jobs)
    .where(and(eq(jobs.state, "done"), lte(jobs.finishedAt, before)))
    .run();
}

/** How many jobs run now or are due and wait. */
export function countDue(connection: Connection, now: number): number {
  const due = or(eq(jobs.state, "running"), and(eq(jobs.state, "queued"), lte(jobs.runAt, now)));
  return connection.select({ due: count() }).from(jobs).where(due).get()?.due ?? 0;
}
