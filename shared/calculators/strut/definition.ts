import { defineCalculator } from "../definition.ts";
import { strut as compute } from "./formula.ts";
import { strutInputs } from "./inputs.ts";

/** A tube pushed end to end. */
export const strut = defineCalculator({
  id: "strut",
  version: 1,
  name: "Strut",
  purpose: "Reckon how hard a straight tube can be pushed end to end before it buckles.",
  group: "Strength",
  words: ["strut", "column", "buckling", "Euler", "leg", "compression", "push", "brace", "prop"],
  inputs: strutInputs,
  example: { shape: "round", od: 48.3, wall: 3, length: 1500, yield: 235, curve: "c" },
  compute,
  resultFields: [
    {
      name: "resistance",
      label: "Resistance",
      unit: "N",
      decimals: 0,
      meaning: "Design value, to compare with the factored load.",
    },
    {
      name: "eulerLoad",
      label: "Euler load",
      unit: "N",
      decimals: 0,
      meaning: "At which a perfect strut would bow.",
    },
    {
      name: "squashLoad",
      label: "Squash load",
      unit: "N",
      decimals: 0,
      meaning: "At which the section yields all over.",
    },
    {
      name: "chi",
      label: "Reduction χ",
      unit: "",
      decimals: 3,
      meaning: "What part of the squash load is left.",
    },
    {
      name: "slenderness",
      label: "Slenderness",
      unit: "",
      decimals: 1,
      meaning: "Effective length over the least radius of gyration.",
    },
    {
      name: "relativeSlenderness",
      label: "Relative slenderness",
      unit: "",
      decimals: 3,
      meaning: "The root of squash load over Euler load.",
    },
    {
      name: "effectiveLength",
      label: "Effective length",
      unit: "mm",
      decimals: 0,
      meaning: "Length times its factor.",
    },
    {
      name: "sectionClass",
      label: "Section class",
      unit: "",
      decimals: 0,
      meaning: "1 is stocky, 3 the thinnest that this sum takes.",
    },
  ],
  cautions: [
    "This is a sum, not an approval. Have an engineer judge anything that people ride in or stand under.",
    "It holds for a straight tube loaded through its middle. A load off centre, a bend, a dent or a sideways push lets it go much sooner.",
    "Buckling gives no warning. The effective length is the number that is most often guessed too short.",
    "Weld heat softens cold-formed and heat-treated tube near the joint. That is not in this sum.",
  ],
  method: {
    formula: [
      "Ncr = π²·E·I / (k·L)²",
      "λ̄ = √(A·fy / Ncr)",
      "Φ = 0.5·(1 + α·(λ̄ − 0.2) + λ̄²),  χ = 1 / (Φ + √(Φ² − λ̄²)) ≤ 1",
      "Nb,Rd = χ·A·fy / γM1",
      "class 3: d/t ≤ 90·235/fy (round), c/t ≤ 42·√(235/fy) (box)",
    ],
    explanation:
      "I is about the weak axis, k the effective length factor, α the imperfection of the chosen curve. A wall past class 3 would crumple locally first, which takes another method: that is an error here.",
    sources: [
      "EN 1993-1-1:2005, 6.3.1 and tables 5.2, 6.1 and 6.2.",
      "EN 10219-2 and EN 10210-2 for the section.",
    ],
  },
});
