import { b, caution, entryLink, h2, p, photo, steps, table, working } from "../document.ts";
import { slope } from "../sums.ts";
import type { DemoEntry } from "../types.ts";
import { corner, row } from "./corner.ts";

const reach = corner.lowerJoint[1] - corner.lowerRear[1];
const ahead = corner.lowerFront[0] - corner.lowerJoint[0];
const behind = corner.lowerJoint[0] - corner.lowerRear[0];

export const lowerWishbone: DemoEntry = {
  slug: "the-lower-wishbone-laid-out",
  title: "The lower wishbone, laid out",
  summary:
    "From the measured upright to two arms on a steel table: one long and slanted, one short and almost square. The almost is what matters.",
  stage: "Front suspension",
  at: "2026-05-31T18:10:00Z",
  state: "public",
  content: [
    p(
      "With the ",
      entryLink("upright measured", "heron", "an-upright-measured-on-the-bench"),
      " I could put the car round it. I set the wheel centre 620 mm from the middle of the car, which makes the track 1240 mm, and hung everything else on that. The table below is the left front corner, standing on its wheels.",
    ),
    table(
      ["Point", "Fore", "Out", "Up"],
      row("Lower pivot, front", corner.lowerFront),
      row("Lower pivot, rear", corner.lowerRear),
      row("Lower joint", corner.lowerJoint),
      row("Upper pivot, front", corner.upperFront),
      row("Upper pivot, rear", corner.upperRear),
      row("Upper joint", corner.upperJoint),
      row("Wheel centre", corner.wheelCentre),
    ),
    p(
      "The lower wishbone is level at this height, so it can be laid out flat on the table with no tilting. The joint is 360 mm out from the line of the pivots. One arm goes to a pivot 230 mm ahead of the joint and the other to a pivot 30 mm behind it.",
    ),
    h2("Two arms, two angles"),
    p(
      "Both arms are 25 × 2.5 mm and end on the sides of the pivot sleeves, which are 38 mm outside. The long one meets its sleeve at the angle whose tangent is 360 over 230: 57.4°. It is 427.2 mm between centres.",
    ),
    working("heron-long-arm", "saddle-cope", "Long arm on its sleeve", {
      headerOd: 38,
      branchOd: 25,
      branchWall: 2.5,
      angle: 57.4,
    }),
    p(
      "The short one is so nearly square that it is tempting to call it square. It is not: 360 over 30 gives 85.2°, and it is 361.2 mm between centres.",
    ),
    working("heron-short-arm", "saddle-cope", "Short arm on its sleeve", {
      headerOd: 38,
      branchOd: 25,
      branchWall: 2.5,
      angle: 85.2,
    }),
    p(
      "Look at the two sides of that one. The heel is 5.8 mm deep and the toe 3.7 mm. On the long arm nobody could mistake which side is which, with 16.2 mm against 0.3 mm. On the short arm the difference is 2.1 mm, on a tube you could hide in your fist.",
    ),
    h2("Laying out"),
    steps(
      "Blue the table. Scribe the pivot line and square a line off it for the joint.",
      "Pin the two sleeves on the pivot line, 260 mm apart, on one length of bar so that they cannot twist.",
      "Bolt the joint plate down over its post, 360 mm out.",
      "Cope the inner ends. Fit them to the sleeves before touching the outer ends, which are only slotted over the plate.",
      "Add the brace between the arms last. It holds whatever shape the rest has, right or wrong.",
    ),
    photo(
      "wishbone-jig",
      "Pinned, bolted and clamped. The bushes are in for the fit-up and come out before any real heat.",
    ),
    caution(
      "A wishbone holds a wheel on. The sum gives a shape to cut to. It says nothing about how strong the arm is, or how good my weld is. Both will be judged by somebody qualified before this goes on a road or a hill.",
    ),
    p(
      "The table is stiff, the pins are tight and everything went down as drawn. I cut both short arms in one evening because the saw was set up. ",
      b("That"),
      ", it turned out, was the mistake, and you can read about it ",
      entryLink("in the next entry", "heron", "scrap-the-short-arm-at-the-wrong-clock"),
      ".",
    ),
  ],
  quoted: [
    { text: "360 mm", sum: () => reach },
    { text: "230 mm", sum: () => ahead },
    { text: "30 mm", sum: () => behind },
    { text: "260 mm", sum: () => ahead + behind },
    { text: "1240 mm", sum: () => 2 * corner.wheelCentre[1] },
    { text: "57.4°", sum: () => slope(reach, ahead) },
    { text: "427.2 mm", sum: () => Math.hypot(reach, ahead) },
    { text: "85.2°", sum: () => slope(reach, behind) },
    { text: "361.2 mm", sum: () => Math.hypot(reach, behind) },
    { text: "16.2 mm", working: "heron-long-arm", result: "heelDepth" },
    { text: "0.3 mm", working: "heron-long-arm", result: "toeDepth" },
    { text: "5.8 mm", working: "heron-short-arm", result: "heelDepth" },
    { text: "3.7 mm", working: "heron-short-arm", result: "toeDepth" },
    { text: "2.1 mm", sum: () => (25 * Math.cos((85.2 * Math.PI) / 180)) / Math.sin((85.2 * Math.PI) / 180) },
  ],
};
