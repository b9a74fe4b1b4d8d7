import { b, caution, h2, list, p, photo, quote, table } from "../document.ts";
import type { DemoEntry } from "../types.ts";
import { caster, kingpinInclination, scrubRadius, trail, upright } from "./corner.ts";

const mm = (value: number) => `${value < 0 ? "−" : ""}${Math.abs(value)} mm`;

export const measuredUpright: DemoEntry = {
  slug: "an-upright-measured-on-the-bench",
  title: "An upright, measured on the bench",
  summary:
    "A donor upright comes with no drawing. Six numbers fix where its joints are, and four more follow from them with a pocket calculator.",
  stage: "Front suspension",
  at: "2026-05-03T16:30:00Z",
  state: "public",
  content: [
    p(
      "The uprights came in a bucket from a man who was clearing his garage. A pair, left and right, with hubs, no history and no drawing. They are plain, strong-looking things with a lug at the top and another low down, tucked inboard. Everything about the front of the car follows from where those two lugs are, so I spent a whole Sunday on six numbers.",
    ),
    photo(
      "upright-bench",
      "On the packing blocks, with the wheel face plumb. The lower joint is the small lug between the blocks.",
    ),
    h2("How I measured"),
    list(
      "A flat steel table, checked with a straightedge and feelers. It is within 0.1 mm over the length I used.",
      "The upright stood on packing with the wheel mounting face plumb, tried with a square from two sides.",
      "Zero is the middle of the hub, on the mounting face. Out is toward the wheel, up is up, fore is toward the front of the car.",
      "Each height three times, with the upright taken down and set up again in between. I used the middle one.",
    ),
    table(
      ["Joint", "Out", "Up", "Fore"],
      ["Lower", mm(upright.lower.out), mm(upright.lower.up), mm(upright.lower.fore)],
      ["Upper", mm(upright.upper.out), mm(upright.upper.up), mm(upright.upper.fore)],
    ),
    p(
      "The worst spread over the three goes was 0.6 mm, on the upper joint's fore. The other five were within 0.3 mm. The rim I have puts its middle 25 mm inboard of the mounting face. The tyre's loaded radius is 268 mm, measured under a friend's trailer with about the right weight on it.",
    ),
    h2("What follows from six numbers"),
    p(
      "The line through the two joints is what the wheel steers about. Over a height of 244 mm it moves inboard 30 mm and back 20 mm. So:",
    ),
    list(
      [b("Kingpin inclination"), " is the angle whose tangent is 30 over 244: 7.0°, leaning in at the top."],
      [b("Caster"), " is the same with 20 over 244: 4.7°, leaning back at the top."],
      [
        b("Trail"),
        ": carry the line down to the ground, 172 mm below the lower joint. It lands 20.1 mm ahead of the tyre's contact.",
      ],
      [b("Scrub radius"), ": at the ground the line is about 16 mm inboard of the middle of the tyre."],
    ),
    p(
      "Those are with the wheel standing straight up. None of them frightens me. None of them is there because I chose it, either. This is what was in the bucket. I could lean the upright back further to get more caster, and that would change the height of the steering arm as well, so I have left it.",
    ),
    h2("Lise asks"),
    quote(
      "You stood the part on its mounting face being plumb. What did you check the face against? If the face is out by a quarter of a degree, your two joints are out by a millimetre, one against the other.",
    ),
    p(
      "She was right to ask. I had checked it against the lugs, which is going in a circle. I ran a dial gauge on a height stand up and down the face: 0.04 mm over 120 mm. That is far less than a quarter of a degree. But I had not known it until she asked, and the first sum was right by luck.",
    ),
    caution(
      "A second-hand upright carries a person and a brake. I have had mine crack-tested by a shop that does it daily. A part that looks sound on a bench has only been looked at.",
    ),
    p(
      "With the joints placed, the wishbones can be laid out. They start from these numbers and from nothing else. If you find that I have got one of them wrong, now is a good moment to say so.",
    ),
  ],
  quoted: [
    { text: "244 mm", sum: () => upright.upper.up - upright.lower.up },
    { text: "172 mm", sum: () => upright.loadedRadius + upright.lower.up },
    { text: "7.0°", sum: kingpinInclination },
    { text: "4.7°", sum: caster },
    { text: "20.1 mm", sum: trail },
    { text: "16 mm", sum: scrubRadius },
  ],
};
