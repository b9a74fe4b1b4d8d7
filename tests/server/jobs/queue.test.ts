import { setTimeout as sleep } from "node:timers/promises";
import { pino } from "pino";
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { jobs } from "#server/db/schema/jobs.ts";
import { createQueue } from "#server/jobs/queue.ts";

const note = z.object({ text: z.string() });

function bench() {
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  const time = { now: 1_000_000 };
  const parts = { database, log: pino({ level: "silent" }), clock: () => time.now };
  const rows = () => database.select().from(jobs).all();
  return { database, time, parts, queue: createQueue(parts), rows };
}

describe("createQueue", () => {
  it("runs a queued job once and drops its payload", async () => {
    const { queue, rows } = bench();
    const seen: string[] = [];
    queue.register("note", note, ({ text }) => void seen.push(text));
    queue.enqueue("note", { text: "tack first" });
    expect(await queue.runDue()).toBe(1);
    expect(await queue.runDue()).toBe(0);
    expect(seen).toEqual(["tack first"]);
    expect(rows()).toMatchObject([{ state: "done", payload: "{}", attempts: 1, finishedAt: 1_000_000 }]);
  });

  it("waits until a job's time has come, then takes the oldest first", async () => {
    const { queue, time } = bench();
    const seen: string[] = [];
    queue.register("note", note, ({ text }) => void seen.push(text));
    queue.enqueue("note", { text: "later" }, { runAt: 1_000_200 });
    queue.enqueue("note", { text: "sooner" }, { runAt: 1_000_100 });
    expect(await queue.runDue()).toBe(0);
    time.now = 1_000_200;
    await queue.runDue();
    expect(seen).toEqual(["sooner", "later"]);
  });

  it("tries again after 5 s, then 10 s, and gives up after the set number of tries", async () => {
    const { queue, time, rows } = bench();
    const tries: number[] = [];
    const given: string[] = [];
    queue.register(
      "note",
      note,
      () => {
        tries.push(time.now);
        throw new Error("no wire");
      },
      { attempts: 3, onFailed: ({ text }, reason) => void given.push(`${text}: ${reason}`) },
    );
    queue.enqueue("note", { text: "weld" });
    await queue.runDue();
    time.now += 4_999;
    expect(await queue.runDue()).toBe(0);
    time.now += 1;
    await queue.runDue();
    expect(rows()).toMatchObject([{ state: "queued", lastError: "no wire", runAt: 1_015_000 }]);
    time.now += 10_000;
    await queue.runDue();
    time.now += 24 * 3600_000;
    expect(await queue.runDue()).toBe(0);
    expect(tries).toEqual([1_000_000, 1_005_000, 1_015_000]);
    expect(given).toEqual(["weld: no wire"]);
    expect(rows()).toMatchObject([{ state: "failed", attempts: 3 }]);
  });

  it("lets another process take over a job whose lease ran out, and ignores the late first one", async () => {
    const { parts, time, rows } = bench();
    let release = () => {};
    const blocked = new Promise<void>((resolve) => {
      release = resolve;
    });
    const [first, second] = [createQueue(parts), createQueue(parts)];
    const seen: string[] = [];
    first.register("note", note, async () => {
      seen.push("first");
      await blocked;
      throw new Error("too late to matter");
    });
    second.register("note", note, () => void seen.push("second"));
    first.enqueue("note", { text: "x" });
    const firstRun = first.runDue();
    time.now += 59_999;
    expect(await second.runDue()).toBe(0);
    time.now += 1;
    expect(await second.runDue()).toBe(1);
    release();
    await firstRun;
    expect(seen).toEqual(["first", "second"]);
    expect(rows()).toMatchObject([{ state: "done", attempts: 2, lastError: null }]);
  });

  it("gives up a job that stops the process on every try", async () => {
    const { parts, time, rows } = bench();
    const given: string[] = [];
    for (let process = 0; process < 3; process += 1) {
      const queue = createQueue(parts);
      queue.register("note", note, () => new Promise<void>(() => {}), {
        attempts: 2,
        onFailed: ({ text }) => void given.push(text),
      });
      if (process === 0) queue.enqueue("note", { text: "poison" });
      // The third finds no try left and returns; the first two hang, as a killed process would.
      await Promise.race([queue.runDue(), sleep(5)]);
      time.now += 60_000;
    }
    expect(given).toEqual(["poison"]);
    expect(rows()).toMatchObject([{ state: "failed" }]);
  });

  it("drops a second job with the same key until the first is over", async () => {
    const { queue, rows } = bench();
    queue.register("note", note, () => {});
    queue.enqueue("note", { text: "one" }, { uniqueKey: "k" });
    queue.enqueue("note", { text: "two" }, { uniqueKey: "k" });
    expect(rows()).toHaveLength(1);
    await queue.runDue();
    queue.enqueue("note", { text: "three" }, { uniqueKey: "k" });
    expect(await queue.runDue()).toBe(1);
    expect(rows()).toHaveLength(2);
  });

  it("queues nothing when the transaction rolls back", async () => {
    const { queue, database, rows } = bench();
    queue.register("note", note, () => {});
    expect(() =>
      database.transaction((connection) => {
        queue.enqueue("note", { text: "never" }, { connection });
        throw new Error("rolled back");
      }),
    ).toThrow("rolled back");
    expect(rows()).toEqual([]);
    database.transaction((connection) => queue.enqueue("note", { text: "kept" }, { connection }));
    expect(rows()).toHaveLength(1);
  });

  it("refuses an unknown kind and a payload that does not fit", () => {
    const { queue, rows } = bench();
    queue.register("note", note, () => {});
    expect(() => queue.enqueue("nope", {})).toThrow("No handler");
    expect(() => queue.enqueue("note", { text: 4 })).toThrow();
    expect(() => queue.register("note", note, () => {})).toThrow("Two handlers");
    expect(rows()).toEqual([]);
  });

  it("once started, wakes on a new job, keeps to the kind's concurrency, and stops after the running ones", async () => {
    const { parts, rows } = bench();
    const queue = createQueue({ ...parts, pollMs: 60_000 });
    let running = 0;
    let most = 0;
    queue.register(
      "note",
      note,
      async () => {
        running += 1;
        most = Math.max(most, running);
        await sleep(5);
        running -= 1;
      },
      { concurrency: 2 },
    );
    queue.start();
    for (let n = 0; n < 5; n += 1) queue.enqueue("note", { text: String(n) });
    await expect.poll(() => rows().filter((row) => row.state === "done").length).toBe(5);
    await queue.stop();
    expect(most).toBe(2);
    queue.enqueue("note", { text: "after the stop" });
    await sleep(10);
    expect(rows().filter((row) => row.state === "queued")).toHaveLength(1);
  });

  it("forgets jobs done more than a week ago, and keeps failed ones", async () => {
    const { queue, time, rows } = bench();
    queue.register(
      "note",
      note,
      ({ text }) => {
        if (text === "bad") throw new Error("bad");
      },
      { attempts: 1 },
    );
    queue.enqueue("note", { text: "good" });
    queue.enqueue("note", { text: "bad" });
    await queue.runDue();
    time.now += 8 * 24 * 3600_000;
    queue.start();
    await expect.poll(() => rows().map((row) => row.state)).toEqual(["failed"]);
    await queue.stop();
  });
});
