import { defineCalculator } from "../definition.ts";
import { bolt as compute } from "./formula.ts";
import { boltInputs } from "./inputs.ts";

/** One steel bolt: what it resists and how hard to tighten it. */
export const bolt = defineCalculator({
  id: "bolt",
  version: 1,
  name: "Bolt",
  purpose: "Reckon what one steel bolt resists in pull and in shear, and the torque that tightens it.",
  group: "Threads and bolts",
  words: [
    "bolt",
    "screw",
    "torque",
    "tighten",
    "preload",
    "clamp",
    "proof load",
    "shear",
    "8.8",
    "10.9",
    "set screw",
  ],
  inputs: boltInputs,
  example: { size: "M12", grade: "8.8" },
  compute,
  resultFields: [
    { name: "stressArea", label: "Stress area", unit: "mm²", decimals: 1, meaning: "Of the thread." },
    {
      name: "proofLoad",
      label: "Proof load",
      unit: "N",
      decimals: 0,
      meaning: "The pull that the bolt takes without lasting stretch.",
    },
    {
      name: "tensionResistance",
      label: "Tension resistance",
      unit: "N",
      decimals: 0,
      meaning: "Design value of one bolt, to compare with the factored load.",
    },
    {
      name: "shearResistance",
      label: "Shear resistance",
      unit: "N",
      decimals: 0,
      meaning: "Design value across one shear plane.",
    },
    { name: "preload", label: "Preload", unit: "N", decimals: 0, meaning: "The clamping force aimed at." },
    { name: "torque", label: "Torque", unit: "N·m", decimals: 1, meaning: "Gives about that preload." },
  ],
  cautions: [
    "This is a sum, not an approval. Have an engineer judge any bolt that people ride on or stand under.",
    "Torque is a poor measure of preload: with friction as it comes, the same torque gives a third more or less. Where it matters, measure stretch or turn.",
    "The resistances are of the bolt alone. Bearing, tear-out and the plates are not looked at, and neither is fatigue.",
    "Use nuts and washers of the bolt's own class. A bolt that was stretched once is scrap.",
  ],
  method: {
    formula: [
      "As = π/4·(d − 0.9382·P)²",
      "proof load = Sp·As",
      "Ft,Rd = 0.9·fub·As / γM2",
      "Fv,Rd = αv·fub·As / γM2 with threads in the plane; 0.6·fub·(π/4·d²) / γM2 without",
      "preload = fraction·proof load;  torque = K·d·preload",
    ],
    explanation:
      "Sp is the stress under proof load of the grade and fub its ultimate strength. αv is 0.6 for 4.6, 5.6 and 8.8, and 0.5 for the others. The resistances compare with loads that already carry their own factors.",
    sources: [
      "ISO 898-1: proof stresses and stress area. ISO 261 and ISO 724: pitches and diameters.",
      "EN 1993-1-8:2005, tables 3.1 and 3.4: resistances.",
      "Torque = K·d·F with K about 0.2, and preload of 0.75 of proof: common practice, no source.",
    ],
  },
});
