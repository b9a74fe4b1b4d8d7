import type { Logger } from "pino";
import { v7 as uuid } from "uuid";
import type { z } from "zod";
import type { Connection, Database } from "#server/db/client.ts";
import {
  countDue,
  forgetDone,
  insertJob,
  type Job,
  leaseDueJob,
  markDone,
  markFailed,
  markForRetry,
} from "./store.ts";

export interface JobOptions<Payload> {
  /** Tries before the job is given up as failed. */
  attempts?: number;
  /** How many of this kind one process runs at once. */
  concurrency?: number;
  /** Longest a run may take before another process may take the job over. */
  leaseMs?: number;
  /** Wait before the next try, by the number of tries so far. */
  backOffMs?: (attempt: number) => number;
  /** Told once when the job is given up. */
  onFailed?: (payload: Payload, reason: string) => void;
}

export interface EnqueueOptions {
  /** Milliseconds since 1970; now unless told. */
  runAt?: number;
  /** A second job with this key is dropped while the first waits or runs. */
  uniqueKey?: string;
  /** The open transaction to queue in: nothing is queued when it rolls back. */
  connection?: Connection;
}

interface Kind {
  name: string;
  schema: z.ZodType;
  handler: (payload: unknown) => Promise<void> | void;
  onFailed: ((payload: unknown, reason: string) => void) | undefined;
  attempts: number;
  concurrency: number;
  leaseMs: number;
  backOffMs: (attempt: number) => number;
  running: number;
}

interface QueueParts {
  database: Database;
  log: Logger;
  clock: () => number;
  /** How often to look for jobs that other processes queued, or that have become due. */
  pollMs?: number;
}

export type Queue = ReturnType<typeof createQueue>;

const keepDoneMs = 7 * 24 * 3600_000;

/** 5 s, 10 s, 20 s, … up to an hour. */
function doubling(attempt: number): number {
  return Math.min(5_000 * 2 ** (attempt - 1), 3600_000);
}

/**
 * The durable job queue in the database. A job runs at least once: after a crash it runs again when its
 * lease is over, so every handler must bear being run twice.
 */
export function createQueue({ database, log, clock, pollMs = 1_000 }: QueueParts) {
  const kinds = new Map<string, Kind>();
  const inFlight = new Set<Promise<void>>();
  let timer: NodeJS.Timeout | null = null;
  let forgottenAt = 0;

  /** Names the handler of a kind of job; once, before the first job of that kind is queued. */
  function register<Schema extends z.ZodType>(
    name: string,
    schema: Schema,
    handler: (payload: z.output<Schema>) => Promise<void> | void,
    options: JobOptions<z.output<Schema>> = {},
  ): void {
    if (kinds.has(name)) throw new Error(`Two handlers for jobs of the kind ${name}`);
    const { attempts = 8, concurrency = 4, leaseMs = 60_000, backOffMs = doubling, onFailed } = options;
    // The payload reaches both functions only through this very schema.
    const untyped = { handler, onFailed } as Pick<Kind, "handler" | "onFailed">;
    kinds.set(name, { name, schema, ...untyped, attempts, concurrency, leaseMs, backOffMs, running: 0 });
  }

  /** Queues a job. A payload that does not fit the kind's schema is a fault of the caller and throws. */
  function enqueue(kind: string, payload: unknown, options: EnqueueOptions = {}): void {
    const known = kinds.get(kind);
    if (!known) throw new Error(`No handler for jobs of the kind ${kind}`);
    known.schema.parse(payload);
    const now = clock();
    insertJob(options.connection ?? database, {
      id: uuid(),
      kind,
      payload: JSON.stringify(payload),
      state: "queued",
      uniqueKey: options.uniqueKey ?? null,
      runAt: options.runAt ?? now,
      createdAt: now,
    });
    // After the present turn, so that an open transaction is over by then.
    if (timer) setImmediate(fill);
  }

  async function run(kind: Kind, job: Job): Promise<void> {
    if (job.attempts > kind.attempts) {
      giveUp(kind, job, "The process stopped in the middle of the last try.");
      return;
    }
    try {
      await kind.handler(kind.schema.parse(JSON.parse(job.payload)));
      markDone(database, job, clock());
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      if (job.attempts >= kind.attempts) {
        giveUp(kind, job, reason);
        return;
      }
      log.warn(
        { err: error, job: job.id, kind: kind.name, attempt: job.attempts },
        "job will be tried again",
      );
      markForRetry(database, job, clock() + kind.backOffMs(job.attempts), reason);
    }
  }

  function giveUp(kind: Kind, job: Job, reason: string): void {
    log.error({ job: job.id, kind: kind.name, reason }, "job failed for good");
    markFailed(database, job, clock(), reason);
    const payload = kind.schema.safeParse(JSON.parse(job.payload));
    if (payload.success) kind.onFailed?.(payload.data, reason);
  }

  /** Starts the oldest due job of a kind, if there is one and a place for it. */
  function startOne(kind: Kind): Promise<void> | null {
    if (kind.running >= kind.concurrency) return null;
    const job = leaseDueJob(database, { kind: kind.name, now: clock(), leaseMs: kind.leaseMs });
    if (!job) return null;
    kind.running += 1;
    const running = run(kind, job)
      .catch((error: unknown) => log.error({ err: error, job: job.id }, "job could not be recorded"))
      .finally(() => {
        kind.running -= 1;
        inFlight.delete(running);
      });
    inFlight.add(running);
    return running;
  }

  function fill(): void {
    if (!timer) return;
    try {
      for (const kind of kinds.values()) {
        for (let started = startOne(kind); started; started = startOne(kind)) void started.then(fill);
      }
      tidy();
    } catch (error) {
      log.error({ err: error }, "the queue could not be read");
    }
  }

  function tidy(): void {
    const now = clock();
    if (now - forgottenAt < 3600_000) return;
    forgottenAt = now;
    forgetDone(database, now - keepDoneMs);
  }

  /** Runs every job that is due now, and those they queue, one after another; returns how many. */
  async function runDue(): Promise<number> {
    let ran = 0;
    for (let again = true; again; ) {
      again = false;
      for (const kind of kinds.values()) {
        for (let job = startOne(kind); job; job = startOne(kind)) {
          await job;
          ran += 1;
          again = true;
        }
      }
    }
    return ran;
  }

  function start(): void {
    timer ??= setInterval(fill, pollMs);
    setImmediate(fill);
  }

  /** Takes no more jobs and waits for those that are running. */
  async function stop(): Promise<void> {
    if (timer) clearInterval(timer);
    timer = null;
    await Promise.all(inFlight);
  }

  /** Jobs that run now or are due and wait. */
  function dueCount(): number {
    return countDue(database, clock());
  }

  return { register, enqueue, runDue, dueCount, start, stop };
}
