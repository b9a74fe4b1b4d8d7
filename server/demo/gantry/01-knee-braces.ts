import { caution, h2, i, list, p, photo, steps, working } from "../document.ts";
import type { DemoEntry } from "../types.ts";

const centres = () => Math.hypot(650, 650);

export const kneeBraces: DemoEntry = {
  slug: "an-angle-that-is-not-the-angle",
  title: "An angle that is not the angle",
  summary:
    "The gantry's knee braces stand at 45° and are coped at 90°. How I found that out, for the price of one brace.",
  stage: "Legs and braces",
  at: "2026-04-19T16:40:00Z",
  state: "public",
  content: [
    p(
      "The shed wants something to hang an engine from. I had an I-beam that was once part of a mezzanine, four castors and enough box section for two A-frames. This is a small job between larger ones, and I meant to write a single paragraph about it. Then I cut the first knee brace.",
    ),
    photo(
      "gantry",
      "As it stands. The knee braces are the two slanted tubes from the top rungs up to the beam.",
    ),
    h2("The brace that did not fit"),
    p(
      "Each A-frame has a rung near the top, a round tube of 48.3 mm, from leg to leg. The knee brace is 33.7 mm tube. It starts on the middle of the rung and goes up at 45° to a plate under the beam. I set the calculator to 45°, printed the sheet and cut a very deep, very slanted cope, which took the best part of an hour.",
    ),
    working("gantry-wrong", "saddle-cope", "What I cut first (do not copy)", {
      headerOd: 48.3,
      branchOd: 33.7,
      branchWall: 2.6,
      angle: 45,
    }),
    p(
      "The heel is 33.7 mm deep there, which is the full diameter of the brace. I held it up to the rung. It touched on two points and waved about. I turned it round, and it touched on two other points.",
    ),
    h2("Which angle"),
    p(
      "The angle that a cope wants is the angle between the two ",
      i("tubes"),
      ". It is not the angle to the floor. The rung runs across the gantry and the brace runs along it. Seen from the end of the rung, the brace leans at 45°. But the rung is a circle from there. It has no idea which way is up. The brace is square to the rung's axis whichever way it leans, just as the spokes of a wheel are all square to the axle.",
    ),
    working("gantry-right", "saddle-cope", "Knee brace on the rung", {
      headerOd: 48.3,
      branchOd: 33.7,
      branchWall: 2.6,
      angle: 90,
    }),
    p(
      "So it is a plain right-angle cope, 6.8 mm deep, and it took ten minutes. The lean only comes in when you ask which way the tube is turned, and for that I drew one line along it and kept it at the top.",
    ),
    h2("A check for next time"),
    steps(
      "Lay a pencil along each tube.",
      "Look straight down on the place where they cross, so that you see both pencils at their full length.",
      "That is the angle. Measure it there and nowhere else.",
    ),
    h2("Length"),
    p(
      "From the rung's axis the brace rises 650 mm and runs 650 mm, so the slope is 919.2 mm. Its tip stops 17.3 mm from the rung's axis. That leaves 901.9 mm to the point where the brace's centre line meets the plate, and the top end is simply sawn at 45° there. I left it 25 mm long and trimmed it in place.",
    ),
    list(
      "Two good braces, one bad one. The bad one is now the handle of the wood stove's poker.",
      "The feet of the A-frames are box section and need no cope at all.",
      "The castors are each marked by their maker. I wrote down what is on the plate and not what I would like it to be.",
    ),
    caution(
      "People will stand near this while something heavy hangs from it. Nothing in this entry is about how much it can lift. That is a separate question, and not one for a cope calculator or for me to settle on my own.",
    ),
  ],
  quoted: [
    { text: "33.7 mm deep", working: "gantry-wrong", result: "heelDepth" },
    { text: "6.8 mm", working: "gantry-right", result: "deepest" },
    { text: "17.3 mm", working: "gantry-right", result: "tipFromAxis" },
    { text: "919.2 mm", sum: centres },
    { text: "901.9 mm", sum: () => centres() - Math.sqrt(24.15 ** 2 - 16.85 ** 2) },
  ],
};
