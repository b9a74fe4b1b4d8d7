import { defineCalculator } from "../definition.ts";
import { filletWeld as compute } from "./formula.ts";
import { filletWeldInputs } from "./inputs.ts";

/** Design resistance of a fillet weld. */
export const filletWeld = defineCalculator({
  id: "fillet-weld",
  version: 1,
  name: "Fillet weld",
  purpose: "Reckon what a fillet weld of this size and length resists.",
  group: "Strength",
  words: ["weld", "fillet", "throat", "leg", "weld strength", "weld size"],
  inputs: filletWeldInputs,
  example: { leg: 6, length: 100, ultimate: 470, correlation: 0.9 },
  compute,
  resultFields: [
    { name: "throat", label: "Throat", unit: "mm", decimals: 2, meaning: "The weld is reckoned on this." },
    { name: "leg", label: "Leg", unit: "mm", decimals: 2, meaning: "Of a weld with equal legs." },
    {
      name: "resistancePerMm",
      label: "Resistance",
      unit: "N/mm",
      decimals: 0,
      meaning: "Of each millimetre of weld, design value.",
    },
    {
      name: "resistance",
      label: "Resistance, whole length",
      unit: "N",
      decimals: 0,
      meaning: "To compare with the factored load.",
    },
  ],
  cautions: [
    "This is a sum, not an approval. It takes a sound weld for granted: have a coded welder make it and an inspector look at it where people ride in or stand under the work.",
    "Only the weld is looked at. The parent metal beside it, the plate or tube wall, and fatigue can each hold less.",
    "A tube on a tube is stiff at some places round the joint and soft at others: the weld is not loaded evenly. EN 1993-1-8, section 7, treats such joints.",
    "Welding is hot work: eyes, skin and lungs covered, nothing that burns nearby, a fire watch afterwards.",
  ],
  method: {
    formula: [
      "throat a = leg / √2",
      "simplified: resistance for each mm = fu·a / (√3·βw·γM2)",
      "directional: times √(3 / (2 + cos²θ)), θ = load to weld",
      "resistance = resistance for each mm · length",
    ],
    explanation:
      "The throat is the height of the triangle of weld. The simplified method gives every direction what a load along the weld gets; the directional method credits a load across it with up to 1.22 times as much, for equal legs and a load in the plane of one leg.",
    sources: ["EN 1993-1-8:2005, 4.5.1 to 4.5.3 and table 4.1."],
  },
});
