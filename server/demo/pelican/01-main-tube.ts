import { caution, h2, list, p, photo, steps, table, working } from "../document.ts";
import { arc, tangent } from "../sums.ts";
import type { DemoEntry } from "../types.ts";

const bend = 22;
const radius = 200;

export const mainTube: DemoEntry = {
  slug: "one-long-tube-with-one-bend",
  title: "One long tube with one bend",
  summary:
    "Pelican hangs on a single 50 mm tube. Where to start the bend, how long to cut it, and the two copes that land on it.",
  stage: "Main tube",
  at: "2026-03-08T11:30:00Z",
  state: "public",
  content: [
    p(
      "Pelican is a cargo trike with two wheels in front, a box between them and a rear half that leans. Everything hangs on one tube. It starts at the cranks, runs forward nearly level, and rises at the front to the pivot that it leans about. It is 50 mm across with a 1.5 mm wall, and it has one bend in it.",
    ),
    photo(
      "trike-frame",
      "On the stand, with the box frame loosely on. The bend is out of sight behind the near wheel.",
    ),
    h2("The bend, on paper"),
    p(
      "I draw the centre line as two straight lines that meet at a corner, and then round the corner off. The turn is 22° and my former has a radius of 200 mm to the middle of the tube. Two sums give all I need at the bender.",
    ),
    table(
      ["What", "How", "Length"],
      ["From the corner to where the bend starts", "200 × tan 11°", "38.9 mm"],
      ["Along the bend", "200 × 22° in radians", "76.8 mm"],
      ["Straight behind it", "From the drawing", "780 mm"],
      ["Straight in front of it", "From the drawing", "310 mm"],
    ),
    p(
      "Add the two straights to the bend and you get 1166.8 mm of tube in the finished part. I left 40 mm over at each end, since the first and last bit of tube in a bender never comes out straight, and cut 1247 mm.",
    ),
    steps(
      "Draw a line right along the tube. It must come out of the bend on the inside, and stay there.",
      "Mark the start of the bend 820 mm from the rear end: 780 mm and the 40 mm spare.",
      "Bend a scrap first. Mine sprang back by two degrees, so I pull to 24° and let go.",
      "Check on a board with the angle drawn on it, not on the dial of the bender.",
    ),
    p("It came out at 21.8° by the board. I could have nudged it. I moved the pivot a millimetre instead."),
    h2("What lands on it"),
    p(
      "Two tubes come down to the main tube. The seat tube stands on it at 72°, just ahead of the cranks. It is 35 mm tube, and the cut is 14.1 mm deep at the heel and 2.7 mm at the toe.",
    ),
    working("pelican-seat", "saddle-cope", "Seat tube on the main tube", {
      headerOd: 50,
      branchOd: 35,
      branchWall: 1.5,
      angle: 72,
    }),
    p(
      "The long brace comes in much flatter, at 36°, and that makes an ugly cut: 41.3 mm at the heel, which is a good deal more than its own diameter of 30 mm. The toe is where the tube is longest. Nothing comes off there at all.",
    ),
    working("pelican-brace", "saddle-cope", "Long brace on the main tube", {
      headerOd: 50,
      branchOd: 30,
      branchWall: 1.5,
      angle: 36,
    }),
    list(
      "Cut the long side with the tube lying in a vee, saw held upright. It wanders otherwise.",
      "At the toe the two surfaces meet so openly that filler runs straight out. I tilt the whole frame until the toe is level.",
      "At the heel they meet so tightly that the flame hardly gets in. That is where I look first for a gap.",
    ),
    caution(
      "The main tube carries the rider, the load and both ends of the frame. The sums here are about shape, not strength. I am having the joints looked at by a frame builder before I ride it further than the yard.",
    ),
    p(
      "Next are the dropouts and the stays that hold them. No more bends, thank goodness. The bender goes back to the school on Monday.",
    ),
  ],
  quoted: [
    { text: "38.9 mm", sum: () => tangent(bend, radius) },
    { text: "76.8 mm", sum: () => arc(bend, radius) },
    { text: "1166.8 mm", sum: () => 780 + 310 + arc(bend, radius) },
    { text: "1247 mm", sum: () => 780 + 310 + arc(bend, radius) + 80 },
    { text: "14.1 mm", working: "pelican-seat", result: "heelDepth" },
    { text: "2.7 mm", working: "pelican-seat", result: "toeDepth" },
    { text: "41.3 mm", working: "pelican-brace", result: "heelDepth" },
  ],
};
