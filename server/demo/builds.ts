import { shedGantry } from "./gantry/build.ts";
import { heron } from "./heron/build.ts";
import { pelican } from "./pelican/build.ts";
import type { DemoBuild } from "./types.ts";

/** Every build of the demo. */
export const demoBuilds: readonly DemoBuild[] = [heron, pelican, shedGantry];
