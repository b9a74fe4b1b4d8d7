import { b, caution, entryLink, h2, i, p, photo, steps, working } from "../document.ts";
import type { DemoEntry } from "../types.ts";

/** Heel depth less toe depth of the short arm: 2 r cot θ. */
const swap = () => 25 / Math.tan((85.2 * Math.PI) / 180);

export const scrap: DemoEntry = {
  slug: "scrap-the-short-arm-at-the-wrong-clock",
  title: "Scrap: the short arm at the wrong clock",
  summary:
    "Both lower wishbones are in pieces. The heel of the short arm was on the wrong side, by half a turn, and two millimetres is enough to hide it until the weld pulls.",
  stage: "Front suspension",
  at: "2026-06-21T19:15:00Z",
  state: "public",
  content: [
    p(
      "I have cut up both lower wishbones. One was welded. The other was only tacked, and could perhaps have been saved, but I did not want to look at it. Here is what happened, in the order I found it out, which is not the order it happened in.",
    ),
    photo(
      "redo-scrap",
      "Left, what is left of the first one. Right, its replacement. The plate I kept, the rest went in the crate.",
    ),
    h2("What I saw"),
    p(
      "The left wishbone came off the jig with a click. They should not click. When I put it back, the hole in the joint plate had moved 6 mm toward the back of the car and the post would not go through it. I checked the sleeves, the pins and the table before I looked at the tube, since the tube was the part I was proud of.",
    ),
    h2("What I had done"),
    p(
      "Every coped tube has a clock. The heel must face the tight corner, and if the other end is slotted, the slot must be at the right turn from the heel. On the long arm nobody could get that wrong. The ",
      entryLink("short arm is nearly square", "heron", "the-lower-wishbone-laid-out"),
      ", so its heel and toe look like twins. I had slotted the outer ends first, because the saw was set up. Then I drew the heel on the wrong side of the slot. Half a turn out.",
    ),
    working("heron-short-arm-again", "saddle-cope", "The short arm, with the heel marked", {
      headerOd: 38,
      branchOd: 25,
      branchWall: 2.5,
      angle: 85.2,
    }),
    p(
      "The heel should be 5.8 mm deep and the toe 3.7 mm. With the two swapped, one side is 2.1 mm too long and the other is 2.1 mm too short. The jig holds the arm at its proper angle, so it cannot lean to suit. It touches on the long side only. It has to back off by 2.1 mm, and the gap on the short side is then twice that: 4.2 mm.",
    ),
    p(
      "I remember that gap. I remember thinking that the sleeve must be a little off, and filling it. I have filled worse on a gate. That much weld on one side of a thin tube shrinks a great deal as it cools, and the arm followed it round. The jig held everything where it was told until I undid the clamps.",
    ),
    caution(
      "A gap that wide on a suspension arm is not a welding job. It is a sign that the tube is wrong. Stop and find out why before any more heat goes in.",
    ),
    h2("What I do now"),
    steps(
      "The cope is always first. The slot is cut to suit it, with the arm lying in the jig.",
      "A chalk cross goes on the heel before the template comes off, and it stays there until the weld is finished.",
      "The table has a matching cross scribed in each tight corner. Cross to cross, or it does not get tacked.",
      "A feeler goes round the joint. If 0.5 mm goes in anywhere, the tube comes out.",
      "One arm at a time. No cutting ahead just because the saw is set.",
    ),
    p(
      "The template would have told me, had I asked it. Heel and toe are both on the sheet in words. I had cut the words off with the waste, because the paper was in the way of the slot. The new sheets are trimmed on the other edge.",
    ),
    h2("The cost"),
    p(
      "About 1.6 m of tube, two sleeves turned again, two weekends. The plates were ",
      b("not"),
      " cut and could be cleaned up. The new left wishbone went over its post with a push of one finger, and came off, and went on again. I did that more times than I needed to. The uppers are drawn the same way and their short arms are nearly square as well, so I am glad to have learned this on the ",
      i("first"),
      " pair.",
    ),
  ],
  quoted: [
    { text: "5.8 mm", working: "heron-short-arm-again", result: "heelDepth" },
    { text: "3.7 mm", working: "heron-short-arm-again", result: "toeDepth" },
    { text: "2.1 mm", sum: swap },
    { text: "4.2 mm", sum: () => 2 * swap() },
    { text: "1.6 m", sum: () => (2 * (Math.hypot(360, 230) + Math.hypot(360, 30))) / 1000 },
  ],
};
