import { b, h2, list, p, photo, table, working } from "../document.ts";
import { slope } from "../sums.ts";
import type { DemoEntry } from "../types.ts";

export const rearEnd: DemoEntry = {
  slug: "the-rear-end-before-anything-is-cut",
  title: "The rear end, before anything is cut",
  summary: "What I know, what I do not, and the order in which I mean to find out.",
  stage: "Rear end",
  at: "2026-11-22T21:10:00Z",
  state: "draft",
  content: [
    p(
      "A draft, for now. I want to get the rear end wrong on paper for once. The front taught me that a thing goes wrong well before the first cut, at the moment when some part of the car is already there and looks handy.",
    ),
    photo("frame-side", "The rear is the left-hand end. So far it is rails, a hoop and hope."),
    h2("What is fixed"),
    p(
      "The rails are 400 mm apart and they run to the back. The stays from the top of the hoop come down to the upper rails. The engine is still in the other shed, so its mounts are not fixed, and ",
      b("nothing may be measured from it"),
      " until it has stood in the frame.",
    ),
    table(
      ["Thing", "Known?", "How"],
      ["Rail positions at the back", "Yes", "Wire and plumb line, three times"],
      ["Hoop height and lean", "Yes", "Plumb line"],
      ["Engine mounts", "No", "Wait for the engine"],
      ["Drive shaft angle", "No", "Follows from the mounts"],
      ["Rear uprights", "No", "To be measured like the front pair"],
    ),
    h2("The hoop stays"),
    p(
      "The stays drop 520 mm over a run of 620 mm, so they meet the rails at 40.0° to the horizontal. That is the flattest joint on the car, and the heel gets very deep. I put it in to see how bad it was.",
    ),
    working("heron-stay", "saddle-cope", "Hoop stay on the upper rail", {
      headerOd: 38,
      branchOd: 32,
      branchWall: 2,
      angle: 40,
    }),
    p(
      "It comes to 38.4 mm at the heel. A hacksaw will not reach that without a second cut from the side. I could move the foot of the stay forward to make the angle kinder, but the bay underneath is where it is, and a stay that lands between two nodes pushes on the middle of a rail. So it stays at the node and I cut the deep one.",
    ),
    h2("To ask before I publish this"),
    list(
      "Whether the hoop rules for a hill climb want a wall thicker than 2 mm. I must look them up and not remember them.",
      "Whether anyone has measured how far a stay like this pulls the hoop when the foot is welded.",
      "Lise: how would you hold a tube at that angle to file the heel?",
    ),
    p(
      "Things I will not do: cut both stays in one evening. Slot anything before it is coped. Mount a single item on a plate because the plate is there. I have written those three on the wall over the saw, where the calendar was, in letters as tall as my thumb.",
    ),
  ],
  quoted: [
    { text: "40.0°", sum: () => slope(520, 620) },
    { text: "38.4 mm", working: "heron-stay", result: "heelDepth" },
  ],
};
