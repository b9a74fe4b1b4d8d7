type Turn = "next" | "when_idle";

/**
 * Runs tasks one after another, so that decoding never takes every core. A task that is to run `when_idle`
 * lets all others go first, also those that come later.
 */
export function createOneAtATime() {
  const waiting: Record<Turn, (() => Promise<void>)[]> = { next: [], when_idle: [] };
  let busy = false;

  async function work(): Promise<void> {
    if (busy) return;
    busy = true;
    for (let task = take(); task; task = take()) await task();
    busy = false;
  }

  function take(): (() => Promise<void>) | undefined {
    return waiting.next.shift() ?? waiting.when_idle.shift();
  }

  return function run<Value>(task: () => Promise<Value>, turn: Turn = "next"): Promise<Value> {
    return new Promise((resolve, reject) => {
      waiting[turn].push(() => task().then(resolve, reject));
      void work();
    });
  };
}
