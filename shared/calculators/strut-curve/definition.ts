import { defineCalculator } from "../definition.ts";
import { strutCurve as compute } from "./formula.ts";
import { strutCurveInputs } from "./inputs.ts";

/** The reduction for buckling alone. */
export const strutCurve = defineCalculator({
  id: "strut-curve",
  version: 1,
  name: "Buckling curve",
  purpose: "Read the reduction for buckling off one of the five curves of EN 1993-1-1.",
  group: "Strength",
  words: ["buckling curve", "chi", "reduction factor", "slenderness", "imperfection"],
  inputs: strutCurveInputs,
  example: { curve: "c", slenderness: 1 },
  compute,
  resultFields: [
    {
      name: "chi",
      label: "Reduction χ",
      unit: "",
      decimals: 4,
      meaning: "What part of the squash load is left.",
    },
    {
      name: "alpha",
      label: "Imperfection α",
      unit: "",
      decimals: 2,
      meaning: "How crooked the curve takes the strut to be.",
    },
  ],
  cautions: [
    "This is a sum, not an approval. Which curve applies depends on how the section was made: take it from the standard, and have an engineer judge what people ride in or stand under.",
  ],
  method: {
    formula: [
      "Φ = 0.5·(1 + α·(λ̄ − 0.2) + λ̄²)",
      "χ = 1 / (Φ + √(Φ² − λ̄²)), and 1 for λ̄ up to 0.2",
      "α = 0.13 (a0), 0.21 (a), 0.34 (b), 0.49 (c), 0.76 (d)",
    ],
    explanation:
      "λ̄ is the root of squash load over Euler load. The curves stand for struts that are never quite straight and never free of locked-in stress.",
    sources: ["EN 1993-1-1:2005, 6.3.1.2 and table 6.1."],
  },
});
