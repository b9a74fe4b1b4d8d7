import { caution, entryLink, h2, p, photo, photos, steps, working } from "../document.ts";
import { sine, slope } from "../sums.ts";
import type { DemoEntry } from "../types.ts";

const between = () => Math.hypot(400, 280);
const heel = (degrees: number) => (16 * sine(90 - degrees) + 19) / sine(degrees);
const tip = () => Math.sqrt(19 ** 2 - 16 ** 2);

export const diagonals: DemoEntry = {
  slug: "diagonals-at-fifty-five-degrees",
  title: "Diagonals at fifty-five degrees",
  summary:
    "One deep side, one shallow side, and the three numbers I needed before I could cut a diagonal to length the first time.",
  stage: "Frame",
  at: "2026-02-15T19:40:00Z",
  state: "public",
  content: [
    p(
      "A frame of squares is a gate. It wants diagonals, and a diagonal meets its rail at a slant. My bays are 280 mm long and the rails are 400 mm apart, so the slant is the angle whose tangent is 400 over 280. That is 55.0° near enough, which was luck. I had not planned it.",
    ),
    photo(
      "cope-angle",
      "The deep side is the one turned toward the tight corner. The packers are only there for the picture.",
    ),
    h2("Heel and toe"),
    p(
      "At a right angle the front and the back of the cope are the same. At a slant they part company. The side that faces into the tight corner is the heel, and it is cut deep. The side that faces the open corner is the toe, and it hardly gets touched.",
    ),
    working("heron-diagonal", "saddle-cope", "Diagonal on the rail", {
      headerOd: 38,
      branchOd: 32,
      branchWall: 1.5,
      angle: 55,
    }),
    p(
      "From a squared end that is 24.2 mm off the heel and 1.7 mm off the toe, with 2.3 mm at each side. The longest points of the tube are neither at the toe nor at the sides. They sit somewhere in between, one on each side of the toe. I would not have found that by eye, and it explains why my hand-filed ones always rocked.",
    ),
    h2("How long is it, then"),
    p("I spoiled two diagonals last time by guessing. This is the order that worked."),
    steps(
      "Distance between the two crossings of the centre lines. Pythagoras on 400 and 280 gives 488.3 mm.",
      "Take the tip distance off each end. The working gives 10.2 mm from the rail's axis to the longest point, measured along the diagonal. Both ends are alike here.",
      "That leaves 467.8 mm from tip to tip. Square the tube at that, plus 25 mm spare for the end I trim last.",
      "Cope the first end. Hold it in place. Only then mark the second.",
    ),
    p(
      "Both heels of one diagonal lie on opposite sides of the tube, because one end leans forward into its rail and the other leans back. If you draw one line along the tube and call it the heel at both ends, the tube will fit at one end only. I drew two lines, in two colours, and wrote H at the end each belonged to.",
    ),
    photos(
      photo(
        "tacked-node",
        "Four tubes at one node. Only tacks so far: everything here can still come apart.",
      ),
      photo("frame-side", "Most of the diagonals in. The chalk drawing is under there somewhere."),
    ),
    caution(
      "Tack, look, measure, then weld. A full bead on one side of a node pulls the tube toward it by more than you would think, and a frame that is welded crooked stays crooked.",
    ),
    h2("What came of it"),
    p(
      "Sixteen diagonals, and one of those is scrap because I put both heels on the same line after writing all of the above in my notebook. The others went in with a gap I could not get a hacksaw blade into. The bay that I checked corner to corner was 1.5 mm out of square before the diagonals and 0.5 mm after.",
    ),
    p(
      "Lise Brandt asked under the last entry whether I measure the angle or trust the drawing. I measured: an adjustable bevel on the rail and a protractor I have checked against a square. I read 55 and could not read better than half a degree. Half a degree moves the heel depth by 0.35 mm, which is about what I can file to. Next is a joint where the tubes ",
      entryLink("do not meet in the middle", "heron", "a-cross-tube-set-five-millimetres-high"),
      ".",
    ),
  ],
  quoted: [
    { text: "55.0°", sum: () => slope(400, 280) },
    { text: "24.2 mm", working: "heron-diagonal", result: "heelDepth" },
    { text: "1.7 mm", working: "heron-diagonal", result: "toeDepth" },
    { text: "2.3 mm", working: "heron-diagonal", result: "sideDepth.at90" },
    { text: "10.2 mm", working: "heron-diagonal", result: "tipFromAxis" },
    { text: "0.35 mm", sum: () => heel(54.5) - heel(55) },
    { text: "488.3 mm", sum: between },
    { text: "467.8 mm", sum: () => between() - 2 * tip() },
  ],
};
