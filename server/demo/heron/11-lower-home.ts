import { caution, entryLink, h2, list, p, photo, steps, working } from "../document.ts";
import type { DemoEntry } from "../types.ts";
import { corner } from "./corner.ts";

/** Height of the middle of the tray rails: the drawn rack is 22 mm above it. */
const rail = corner.rodInner[2] - 22;
const crossTube = corner.rodInner[2] - 23.5 - 3 - 12.5;

export const lowerHome: DemoEntry = {
  slug: "a-lower-home-for-the-rack",
  title: "A lower home for the rack",
  summary:
    "The sum for a cross tube that puts the rack where it was drawn, the joint that cannot be made, and the one that can.",
  stage: "Steering",
  at: "2026-11-29T16:00:00Z",
  state: { scheduledInDays: 9 },
  content: [
    p(
      "The rack has to come down 22 mm. ",
      entryLink("That is settled.", "heron", "twenty-two-millimetres-too-high"),
      " This is about what to hang it from, and it starts with a joint that I wanted and could not have.",
    ),
    h2("Working back from the height"),
    p(
      "The inner rod joints belong 208 mm above the ground. I should like to keep the clamp blocks, because they are the only thing about the old mount that fits. So, going down from the rack:",
    ),
    list(
      "23.5 mm of clamp block",
      "3 mm of plate under it, smaller than the tray but the same stuff",
      "12.5 mm, half of a 25 mm cross tube",
    ),
    p(
      "The middle of that cross tube comes out at 169 mm above the ground. The tray rails are at 186 mm. The new tube wants to be 17 mm below the middle of a rail that is only 19 mm from middle to edge.",
    ),
    h2("The joint that cannot be made"),
    p(
      "I typed it in all the same: a 25 mm branch on a 38 mm rail, offset 17 mm. The answer was a line in red. The branch runs past the rail, and the offset has to stay within 6.5 mm either way. I knew that. I wrote that very number down in March. But I had quite made up my mind to hang it from the rails, and it took the red line to stop me.",
    ),
    h2("The joint that can"),
    p(
      "There are two uprights just ahead of the pedals, 38 mm tube, 440 mm apart between centres. They stand straight up, so a cross tube can meet them at any height I like, square and in the middle. It is the plainest joint there is.",
    ),
    working("heron-rack-tube", "saddle-cope", "Rack cross tube on the uprights", {
      headerOd: 38,
      branchOd: 25,
      branchWall: 2,
      angle: 90,
    }),
    p(
      "The cut is 4.7 mm deep, front and back alike, with nothing off the sides. The tips stop 14.3 mm from each upright's axis, so the tube is 411.4 mm from tip to tip. I have gone up to a 2 mm wall because the rack pushes on it sideways all day long.",
    ),
    photo(
      "cope-90",
      "The same sort of joint from the frame. I have cut enough of these by now to do it with the radio on.",
    ),
    h2("What it costs"),
    p(
      "The brake pedal has to move back 15 mm and its rod with it. That was what I had been avoiding in August. It took one morning. I spent longer than that making the slots in the old brackets.",
    ),
    steps(
      "Wooden cross tube first, cut from a broom, wedged between the uprights at 169 mm.",
      "Rack clamped to it, rods screwed out to suit, plate back on the hub.",
      "Toe at five heights from 40 mm bump to 40 mm rebound.",
    ),
    p(
      "With the broom handle in place I could not measure any change of toe at all, which with my wire means less than half a millimetre across the plate. Lise's sum says the same. The steel one gets tacked next weekend and measured again before it is welded, and again after.",
    ),
    caution(
      "No part of this has been approved by anyone. It is a sum and a broom handle. The finished mount goes in front of an engineer with the rest of the steering.",
    ),
  ],
  quoted: [
    { text: "208 mm", sum: () => corner.rodInner[2] },
    { text: "169 mm", sum: () => crossTube },
    { text: "186 mm", sum: () => rail },
    { text: "17 mm", sum: () => rail - crossTube },
    { text: "6.5 mm", sum: () => (38 - 25) / 2 },
    { text: "4.7 mm", working: "heron-rack-tube", result: "deepest" },
    { text: "14.3 mm", working: "heron-rack-tube", result: "tipFromAxis" },
    { text: "411.4 mm", sum: () => 440 - 2 * Math.sqrt(19 ** 2 - 12.5 ** 2) },
  ],
};
