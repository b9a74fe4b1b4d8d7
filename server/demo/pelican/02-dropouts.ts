import { caution, entryLink, h2, list, p, photo, steps, working } from "../document.ts";
import { slope } from "../sums.ts";
import type { DemoEntry } from "../types.ts";

const splay = () => slope((135 - 60) / 2, 357);
const spread = () => 60 + ((135 - 60) * 120) / 357;

export const dropouts: DemoEntry = {
  slug: "brazing-the-dropouts",
  title: "Brazing the dropouts",
  summary:
    "Slotting the stays, keeping two plates parallel while everything is orange, and a bridge so small that I nearly did not bother to work it out.",
  stage: "Dropouts and stays",
  at: "2026-05-17T10:15:00Z",
  state: "public",
  content: [
    p(
      "The rear wheel hangs in two plates, and the plates sit in slots in the ends of four thin tubes. That is all a dropout is. The trouble is that the two plates must be parallel, at the right width, and level with one another, and they have to stay so while I heat them until the brass flows.",
    ),
    h2("The stays"),
    p(
      "The lower stays are 18 × 1 mm. They leave the crank end 60 mm apart between centres and reach the plates 135 mm apart, over a length of 357 mm along the middle of the frame. Half the difference over the length gives the splay of each: 6.0°.",
    ),
    photo(
      "template-wrap",
      "I print sheets even for tubes this thin. The masking tape does more work than the printer.",
    ),
    h2("The bridge"),
    p(
      "Between the lower stays, 120 mm behind the cranks, goes a small bridge of 14 × 1 mm tube. It stops the stays from working like a tuning fork. It is square to the middle of the frame, but the stays are not parallel to it, so it meets each of them at 84.0°.",
    ),
    working("pelican-bridge", "saddle-cope", "Bridge between the lower stays", {
      headerOd: 18,
      branchOd: 14,
      branchWall: 1,
      angle: 84,
    }),
    p(
      "The heel is 4.1 mm deep and the toe 2.7 mm, and both heels face forward, where the stays come together. On a piece this small I would have filed both ends to look about right and been surprised. The stays are 85.2 mm apart at that place, and the tips stop 5.7 mm from each axis, so the bridge is 73.9 mm long, tip to tip. I held it in a clothes peg to file it.",
    ),
    p(
      "If you think the difference is too small to matter, read what it did to ",
      entryLink("Maren's short arm", "heron", "scrap-the-short-arm-at-the-wrong-clock"),
      ". Hers was 85.2° and mine is 84.0°. I drew a dot on each heel with correction fluid, and it survived the flux.",
    ),
    h2("In the order I did it"),
    steps(
      "Slot the stay ends with two hacksaw blades side by side. That is just the thickness of my plate.",
      "Bolt both plates to a dummy axle turned to the right width. It is a length of threaded bar with four nuts.",
      "Clean everything to bright metal, twenty millimetres past the joint, inside as well.",
      "Flux, then heat the plate more than the tube. The plate is thick and drinks heat. The tube is thin and burns.",
      "Feed brass from one side and wait until it shows at the other.",
      "Bridge last, with the plates still bolted up.",
    ),
    caution(
      "Flux fumes are bad for lungs and eyes. Work with the door open and a fan behind you. Never braze over zinc or cadmium plating, and never quench: hot brass joints crack, and hot water spits.",
    ),
    h2("How it came out"),
    list(
      "Width over the plates: 0.4 mm under what the axle wanted. A hard stare was enough to spread it.",
      "A straightedge across one plate passes the other with less than a millimetre of light at the end.",
      "A wheel dropped in sits in the middle to within 1.5 mm. I will take that out with a file in one slot.",
      "One joint has a pinhole. I can see it. I shall do that one again.",
    ),
    p(
      "Soaking the flux off took longer than the brazing. Hot water, a stiff brush and the whole of a radio play. Pia asked whether it could just be painted over. It cannot: what is left of the flux draws damp, lifts the paint and eats the joint from outside.",
    ),
  ],
  quoted: [
    { text: "6.0°", sum: splay },
    { text: "84.0°", sum: () => 90 - splay() },
    { text: "4.1 mm", working: "pelican-bridge", result: "heelDepth" },
    { text: "2.7 mm", working: "pelican-bridge", result: "toeDepth" },
    { text: "5.7 mm", working: "pelican-bridge", result: "tipFromAxis" },
    { text: "85.2 mm", sum: spread },
    { text: "73.9 mm", sum: () => spread() - 2 * Math.sqrt(9 ** 2 - 7 ** 2) },
  ],
};
