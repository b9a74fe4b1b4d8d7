import type { DemoBuild } from "../types.ts";
import { fourRails } from "./01-four-rails.ts";
import { oneRadiusDeep } from "./02-one-radius-deep.ts";
import { diagonals } from "./03-diagonals.ts";
import { crossTube } from "./04-cross-tube.ts";
import { measuredUpright } from "./05-upright.ts";
import { lowerWishbone } from "./06-lower-wishbone.ts";
import { scrap } from "./07-scrap.ts";
import { offcutAndMarker } from "./08-offcut-and-marker.ts";
import { rackOnTheTray } from "./09-rack-on-tray.ts";
import { twentyTwoTooHigh } from "./10-too-high.ts";
import { lowerHome } from "./11-lower-home.ts";
import { rearEnd } from "./12-rear-end.ts";

/** A single-seat hillclimb car with a tube spaceframe. */
export const heron: DemoBuild = {
  slug: "heron",
  title: "Heron",
  purpose: "A single-seat hillclimb car with a tube spaceframe, made in a shed by one person.",
  status: "under_way",
  owner: "maren",
  cover: "frame-front",
  startedAt: "2025-12-07T17:00:00Z",
  stages: [
    { title: "Frame", state: "done" },
    { title: "Front suspension", state: "under_way" },
    { title: "Steering", state: "being_redone" },
    { title: "Rear end", state: "planned" },
  ],
  entries: [
    fourRails,
    oneRadiusDeep,
    diagonals,
    crossTube,
    measuredUpright,
    lowerWishbone,
    scrap,
    offcutAndMarker,
    rackOnTheTray,
    twentyTwoTooHigh,
    lowerHome,
    rearEnd,
  ],
};
