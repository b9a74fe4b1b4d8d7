import { defineCalculator } from "../definition.ts";
import { sheetBend as compute } from "./formula.ts";
import { sheetBendInputs } from "./inputs.ts";

/** Flat length and bend lines of a bent sheet. */
export const sheetBend = defineCalculator({
  id: "sheet-bend",
  version: 1,
  name: "Sheet bend",
  purpose: "Find the flat length of a bent sheet and where to mark its bends.",
  group: "Bending",
  words: [
    "bend allowance",
    "bend deduction",
    "K-factor",
    "folding",
    "press brake",
    "flat pattern",
    "flange",
    "bracket",
  ],
  inputs: sheetBendInputs,
  example: { flanges: [40, 60, 40], angles: [90, 90], thickness: 2, insideRadius: 3, kFactor: 0.42 },
  compute,
  resultFields: [
    {
      name: "flatLength",
      label: "Flat length",
      unit: "mm",
      decimals: 2,
      meaning: "Cut the sheet to this.",
    },
    {
      name: "bendLines.0",
      label: "First bend line",
      unit: "mm",
      decimals: 2,
      meaning: "From the edge to the middle of the first bend.",
    },
    {
      name: "bends.0.allowance",
      label: "Allowance, first bend",
      unit: "mm",
      decimals: 2,
      meaning: "Length of sheet in the bend.",
    },
    {
      name: "bends.0.setback",
      label: "Setback, first bend",
      unit: "mm",
      decimals: 2,
      meaning: "From the start of the bend to where the outside faces would meet.",
    },
    {
      name: "bends.0.deduction",
      label: "Deduction, first bend",
      unit: "mm",
      decimals: 2,
      meaning: "To take off the sum of the two outside lengths.",
    },
  ],
  cautions: [
    "The K-factor belongs to your sheet and your tools. Bend a strip of the same sheet, measure it, and put the K-factor right before you cut the piece.",
    "Fingers clear of the tools. Fresh edges cut: deburr before you handle the sheet.",
    "A radius tighter than the sheet allows cracks on the outside. Look up the least radius of your grade, and bend across the rolling direction.",
  ],
  method: {
    formula: [
      "allowance = π/180·A·(R + K·T)",
      "setback = (R + T)·tan(A/2)",
      "deduction = 2·setback − allowance",
      "flat length = Σ flanges − Σ deductions",
      "bend line = flat parts and allowances before it + allowance / 2",
    ],
    explanation:
      "A is the angle the sheet is turned through, R the inside radius, T the thickness and K the place of the layer that keeps its length. Flanges are outside lengths, measured to where the outside faces would meet; past 90° that point lies beyond the metal.",
    sources: [
      "Machinery's Handbook: lengths of straight stock for bends, there with fixed values of K for soft, medium and hard sheet.",
      "K about 0.45 for mild steel: common practice, no source.",
    ],
  },
});
