import { b, caution, h2, list, p, quote, table, working } from "../document.ts";
import { sine } from "../sums.ts";
import type { DemoEntry } from "../types.ts";

const gravity = 9.81;
/** How hard the load tips the box for each radian of lean, N·m. */
const tipping = (kilograms: number, metres: number) => kilograms * gravity * metres;
const loaded = tipping(72, 0.34);
const empty = tipping(12, 0.25);
const arm = 0.115;
/** How hard a pair of springs rights it for each radian, N·m, from the rate in N/mm. */
const righting = (rate: number) => 2 * rate * 1000 * arm ** 2;
const degree = Math.PI / 180;

export const springs: DemoEntry = {
  slug: "how-stiff-to-stand-up",
  title: "How stiff to stand up",
  summary:
    "A box that leans wants to fall over. Two springs hold it up. The sum for the softest that will, and why I went half as stiff again.",
  stage: "Tilt and springs",
  at: "2026-09-13T14:50:00Z",
  state: "public",
  content: [
    p(
      "On Pelican the box leans with the rider. It turns about a pivot low down, so a load of shopping sits above the pivot like a broom balanced on a palm. With nothing to hold it, it falls to one side as soon as you stop. Two springs, one on each side, push it back toward upright.",
    ),
    h2("The softest that will do"),
    p(
      "This is one of those sums that looks hard and is not. Lean the load a little, and its weight pulls it further over. The pull for each bit of lean is the weight times its height above the pivot. A spring on an arm pushes back: rate times the arm, and times the arm again, because a longer arm both moves the spring more and pushes with more leverage. There are two of them.",
    ),
    table(
      ["What", "Loaded", "Empty"],
      ["Mass above the pivot", "72 kg", "12 kg"],
      ["Height of its middle above the pivot", "340 mm", "250 mm"],
      ["Tips over with, for each radian", "240 N·m", "29 N·m"],
    ),
    p(
      "My arms are 115 mm. For the two springs just to balance 240 N·m, each needs a rate of 9.1 N/mm. At that the box would stay wherever you let go of it, which is not what I want. It has to come back.",
    ),
    p(
      "I bought a pair marked 14 N/mm, hung weights on one and measured 13.8. Taking it as 14, the pair rights the box with 370 N·m for each radian, so with the full load there is 130 N·m left over. At five degrees of lean that pushes back with 11.4 N·m, which is about a bag of sugar on the end of my arm. Empty, it is well over twice as much, and you feel it.",
    ),
    h2("Weighing a box of shopping"),
    list(
      "The mass is easy: bathroom scales, box on, box off.",
      "The height I got by tipping. Lay the loaded box on its back on a round bar and roll it until it balances. The bar is under the middle.",
      "I did it with four loads. Tins are low and cereal is high. The worst was compost in tall bags, and that is the one in the table.",
    ),
    h2("The towers"),
    p(
      "The springs stand on two short towers of 25 mm tube that lean out from the main tube at 65°. It is an easy cope after the last lot: 11.8 mm at the heel, and the toe gives up only 0.1 mm. I marked the heel all the same.",
    ),
    working("pelican-tower", "saddle-cope", "Spring tower on the main tube", {
      headerOd: 50,
      branchOd: 25,
      branchWall: 1.5,
      angle: 65,
    }),
    quote("Why not stiffer still, and have done with it? – Tam"),
    p(
      "Because then it would not lean, Tam, and a narrow trike that does not lean wants to roll over on a bend. ",
      b("Too soft falls over standing still, too stiff falls over going round a corner."),
      " The springs sit in between. Where exactly is a matter of riding it in a car park with sandbags.",
    ),
    caution(
      "The sum is for small angles and a load that does not slide. A load that shifts is worse than a load that is heavy. Try yours empty first, slowly, with knees and elbows covered, and with nobody in the box.",
    ),
    p(
      "Done so far: up and down the yard, empty, at walking pace. It stands up by itself. With 30 kg of sand it stands up by itself as well, more thoughtfully.",
    ),
  ],
  quoted: [
    { text: "240 N·m", sum: () => loaded },
    { text: "29 N·m", sum: () => empty },
    { text: "9.1 N/mm", sum: () => loaded / (2 * arm ** 2) / 1000 },
    { text: "370 N·m", sum: () => righting(14) },
    { text: "130 N·m", sum: () => righting(14) - loaded },
    { text: "11.4 N·m", sum: () => righting(14) * 5 * degree - loaded * sine(5) },
    { text: "11.8 mm", working: "pelican-tower", result: "heelDepth" },
    { text: "0.1 mm", working: "pelican-tower", result: "toeDepth" },
  ],
};
