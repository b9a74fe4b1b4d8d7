import { islandSource } from "#src/lib/island.tsx";

/** A kept working: whole in the page as it comes, alive when it nears the screen. */
export const workingPanel = islandSource(() =>
  import("#src/features/workings/components/working-panel.tsx").then((module) => module.WorkingPanel),
);

export const exampleWorking = islandSource(() =>
  import("./example-working.tsx").then((module) => module.ExampleWorking),
);
