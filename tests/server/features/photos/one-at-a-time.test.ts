import { describe, expect, it } from "vitest";
import { createOneAtATime } from "#server/features/photos/one-at-a-time.ts";

function setUp() {
  const run = createOneAtATime();
  const order: string[] = [];
  const task = (name: string) => async () => {
    order.push(`${name} begins`);
    await Promise.resolve();
    order.push(`${name} ends`);
    return name;
  };
  return { run, order, task };
}

describe("createOneAtATime", () => {
  it("ends one task before it begins the next, in the order they came", async () => {
    const { run, order, task } = setUp();
    expect(await Promise.all([run(task("a")), run(task("b"))])).toEqual(["a", "b"]);
    expect(order).toEqual(["a begins", "a ends", "b begins", "b ends"]);
  });

  it("lets every other task go before one that waits for an idle moment", async () => {
    const { run, order, task } = setUp();
    const all = [run(task("a")), run(task("late"), "when_idle"), run(task("b")), run(task("c"))];
    await Promise.all(all);
    expect(order.filter((line) => line.endsWith("begins"))).toEqual(
      ["a", "b", "c", "late"].map((n) => `${n} begins`),
    );
  });

  it("hands a failure to whoever asked and goes on", async () => {
    const { run, task } = setUp();
    const failing = run(() => Promise.reject(new Error("no picture")));
    const after = run(task("after"));
    await expect(failing).rejects.toThrow("no picture");
    expect(await after).toBe("after");
  });
});
