import { defineCalculator, type ResultField } from "../definition.ts";
import { stockCutting as compute } from "./formula.ts";
import { stockCuttingInputs } from "./inputs.ts";

const field = (
  name: string,
  label: string,
  unit: string,
  decimals: number,
  meaning: string,
): ResultField => ({
  name,
  label,
  unit,
  decimals,
  meaning,
});

/** Pieces into bars with the least waste. */
export const stockCuttingCalculator = defineCalculator({
  id: "stock-cutting",
  version: 1,
  name: "Stock cutting",
  purpose: "Fit a cut list into bars with the least waste, and know how near to the best the plan is.",
  group: "Cutting stock",
  words: [
    "cut list",
    "nesting",
    "bar optimiser",
    "linear cutting",
    "offcut",
    "waste",
    "saw list",
    "tube order",
    "kerf",
  ],
  inputs: stockCuttingInputs,
  example: {
    pieces: [
      { label: "Rail", length: 1840, count: 4 },
      { label: "Post", length: 745, count: 8 },
      { label: "Brace", length: 1120, count: 6 },
      { label: "Cross", length: 430, count: 10 },
    ],
    stock: [{ length: 6000 }],
    kerf: 2,
    trim: 10,
  },
  compute,
  resultFields: [
    field("bars", "Bars", "", 0, "How many to take."),
    field("utilisation", "Used", "%", 1, "Share of the bars' length that becomes pieces."),
    field(
      "lowerBound",
      "No plan needs less than",
      "",
      2,
      "Bars with one length of bar; else their length in mm, or their cost.",
    ),
    field("overBound", "More than that", "", 2, "0: no better plan exists."),
    field("stockLength", "Bars together", "mm", 0, "Length to take off the rack."),
    field("pieceLength", "Pieces together", "mm", 0, "Length of the cut list."),
  ],
  cautions: [
    "Measure the bars before you cut: a mill length is often a few millimetres over, sometimes under.",
    "Cut the longest pieces first, and mark each as it comes off the saw. A plan is worth nothing once a bar is cut short.",
    "Clamp bar and offcut. Short pieces jam in a saw: mind your fingers, and cover eyes and ears.",
  ],
  method: {
    formula: [
      "pattern: pieces out of one bar, Σ length + (n − 1)·kerf ≤ bar − trim",
      "least Σ cost·x over all patterns, each piece cut as often as wanted, x whole numbers",
      "lower bound: the same with parts of bars allowed, rounded up to what bars can cost",
      "offcut = bar − trim − Σ (length + kerf)",
      "used = Σ pieces / Σ bars",
    ],
    explanation:
      "With one length of bar the number of bars is made least; with several their length, or their cost when every one has a price. The relaxed programme is solved by making patterns as they are needed. Whole plans come from rounding and from a search that allows each bar only what is left between the bound and the plan asked for. When it gives up, the plan can still be cut, and the difference to the bound is shown. Lengths count in tenths of a millimetre (fifths past 6.5 m), pieces rounded up.",
    sources: [
      "P. C. Gilmore and R. E. Gomory, A linear programming approach to the cutting-stock problem, Operations Research 9 (1961).",
      "Compared in our tests with exhaustive search on small lists and with the bound of a general-purpose integer programming solver on large ones.",
    ],
  },
});
