import { caution, entryLink, h2, list, p, photo, quote, steps, table } from "../document.ts";
import type { DemoEntry } from "../types.ts";
import { rackAboveRail } from "./09-rack-on-tray.ts";

const plate = 400;
const across = (degrees: number) => plate * Math.tan((degrees * Math.PI) / 180);

/** Toe in degrees with the rack on the tray, from Lise's sum; the test works the corner out again to check it. */
export const toeOnTray = { bump40: -1.53, bump20: -0.76, rebound40: 1.56 } as const;

export const twentyTwoTooHigh: DemoEntry = {
  slug: "twenty-two-millimetres-too-high",
  title: "Twenty-two millimetres too high",
  summary:
    "Lise did the sum I had avoided. The front wheels toe out in bump, by an amount you can see from across the shed. The rack comes off the tray.",
  stage: "Steering",
  at: "2026-10-18T17:20:00Z",
  state: "public",
  content: [
    p(
      "I asked for a sum and I got one. Four days after ",
      entryLink("the last entry", "heron", "the-rack-goes-on-the-tray"),
      " Lise Brandt wrote to say that she had taken my table of points and worked the corner through its travel, the long way, with a spreadsheet and two evenings.",
    ),
    quote(
      "With the rack where you drew it, the toe hardly moves. With the rack on your tray it goes out by one and a half degrees at 40 mm of bump. Each wheel. You would feel the car dart off every kerb. I have done it twice because I did not believe it either.",
    ),
    h2("Measuring instead of bouncing"),
    p(
      "The uppers were finished by then, so I could check her. I took the springs out, set the frame on blocks and clamped a 400 mm straight plate across the wheel mounting face, level. Then I packed the hub up and down and measured from each end of the plate to a wire stretched along the car. The difference between the two ends is the toe.",
    ),
    photo(
      "frame-front",
      "The corner mocked up. The spring is only there to fill the gap and came out for the measuring.",
    ),
    table(
      ["Travel", "Lise's sum", "Same, across 400 mm", "What I measured"],
      ["40 mm bump", "1.53° out", "10.7 mm", "11 mm out"],
      ["20 mm bump", "0.76° out", "5.3 mm", "5.5 mm out"],
      ["At rest", "0", "0", "0, as set"],
      ["40 mm rebound", "1.56° in", "10.9 mm", "10.5 mm in"],
    ),
    p(
      "My wire is good to half a millimetre on a still day. She is right. There is no reading of those numbers in which she is not. I had looked at those wheels with my own eyes, bounced the car by a hand's breadth and seen nothing, because I bounced both sides at once and was looking at the tyres and not at a plate.",
    ),
    h2("Why it does that"),
    p(
      "The rack is ahead of the wheel centre. With the inner joint too high, the rod slopes down on its way out. As the wheel rises the rod comes up toward level, and a rod coming up to level reaches further out. It pushes the front of the wheel outward. In rebound the slope gets worse and it pulls the front in. If the rod lies along the right line, it swings in step with the arms and the two nearly cancel.",
    ),
    h2("The choice is overturned"),
    p(
      "The rack comes down 22 mm, to where it was drawn. The reason for having it on the tray was that the tray was there. That was never a reason about steering. I knew it at the time and wrote it down as if it were an excuse. This is what stood on it and has to be looked at again:",
    ),
    list(
      "The two rack brackets, slots and all. Scrap, or brackets for something that does not matter.",
      "Both rods. They were cut for the higher rack and will be the wrong length by a little: to be measured, not guessed.",
      "The hole for the steering shaft, which is in the wrong place in the bulkhead by about the same 22 mm.",
      "The August entry. I will not change its words. It now says what I believed then.",
    ),
    caution(
      "A car that steers itself over bumps can be impossible to hold. If you have copied the tray mount from my August entry, take it off the road and measure it.",
    ),
    h2("Before the next cut"),
    steps(
      "Find something to hang the rack from at the right height, and do the sum for its position first.",
      "Mock it up in wood. Repeat the plate measurement at five heights.",
      "Only then cut steel.",
    ),
    p("Thank you, Lise. I owe you two evenings."),
  ],
  quoted: [
    { text: "22 mm", sum: () => rackAboveRail - 22 },
    { text: "1.53°", sum: () => -toeOnTray.bump40 },
    { text: "0.76°", sum: () => -toeOnTray.bump20 },
    { text: "1.56°", sum: () => toeOnTray.rebound40 },
    { text: "10.7 mm", sum: () => across(-toeOnTray.bump40) },
    { text: "5.3 mm", sum: () => across(-toeOnTray.bump20) },
    { text: "10.9 mm", sum: () => across(toeOnTray.rebound40) },
  ],
};
