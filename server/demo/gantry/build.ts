import type { DemoBuild } from "../types.ts";
import { kneeBraces } from "./01-knee-braces.ts";
import { noNumber } from "./02-no-number.ts";

/** A small portable gantry for the shed. */
export const shedGantry: DemoBuild = {
  slug: "shed-gantry",
  title: "Shed gantry",
  purpose: "A small gantry on castors, to hang an engine from while it is measured.",
  status: "paused",
  owner: "maren",
  cover: "gantry",
  startedAt: "2026-04-12T09:00:00Z",
  stages: [
    { title: "Legs and braces", state: "done" },
    { title: "Beam and hoist", state: "under_way" },
  ],
  entries: [kneeBraces, noNumber],
};
