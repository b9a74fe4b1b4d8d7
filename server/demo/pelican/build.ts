import type { DemoBuild } from "../types.ts";
import { mainTube } from "./01-main-tube.ts";
import { dropouts } from "./02-dropouts.ts";
import { springs } from "./03-springs.ts";

/** A tilting cargo trike. */
export const pelican: DemoBuild = {
  slug: "pelican",
  title: "Pelican",
  purpose: "A cargo trike that leans, with two wheels and a box in front, brazed from bicycle-sized tube.",
  status: "under_way",
  owner: "idris",
  cover: "trike-frame",
  startedAt: "2026-03-01T10:00:00Z",
  stages: [
    { title: "Main tube", state: "done" },
    { title: "Dropouts and stays", state: "done" },
    { title: "Tilt and springs", state: "under_way" },
    { title: "Box", state: "planned" },
  ],
  entries: [mainTube, dropouts, springs],
};
