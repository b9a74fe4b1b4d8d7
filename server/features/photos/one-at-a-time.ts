/** Runs tasks one after another in the order they come, so that decoding never takes every core. */
export function createOneAtATime() {
  let last: Promise<unknown> = Promise.resolve();
  return function run<Value>(task: () => Promise<Value>): Promise<Value> {
    const mine = last.then(task);
    // Not the outcome itself, which may be megabytes.
    last = mine.then(
      () => {},
      () => {},
    );
    return mine;
  };
}
