import { defineCalculator } from "../definition.ts";
import { saddleCope as compute } from "./formula.ts";
import { saddleCopeInputs } from "./inputs.ts";
import { copeTemplate } from "./template.ts";

/** The end of a round tube (branch) fitted to the side of another round tube (header). */
export const saddleCope = defineCalculator({
  id: "saddle-cope",
  version: 1,
  name: "Saddle cope",
  purpose: "Mark and cut the end of one round tube so that it sits on the side of another.",
  group: "Tube and joints",
  words: [
    "notch",
    "fishmouth",
    "cope",
    "coping",
    "tube joint",
    "wrap template",
    "hole saw",
    "saddle",
    "branch",
  ],
  inputs: saddleCopeInputs,
  example: { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60, offset: 0 },
  compute,
  template: copeTemplate,
  resultFields: [
    {
      name: "deepest",
      label: "Deepest cut",
      unit: "mm",
      decimals: 1,
      meaning: "From the squared end to the lowest point of the outside line.",
    },
    {
      name: "deepestAround",
      label: "Deepest at",
      unit: "°",
      decimals: 0,
      meaning: "Round the branch from the heel.",
    },
    { name: "heelDepth", label: "Depth at heel", unit: "mm", decimals: 1, meaning: "On the acute side." },
    {
      name: "sideDepth.at90",
      label: "Depth at 90° side",
      unit: "mm",
      decimals: 1,
      meaning: "A quarter turn from the heel.",
    },
    { name: "toeDepth", label: "Depth at toe", unit: "mm", decimals: 1, meaning: "On the obtuse side." },
    {
      name: "sideDepth.at270",
      label: "Depth at 270° side",
      unit: "mm",
      decimals: 1,
      meaning: "Three quarters of a turn from the heel.",
    },
    {
      name: "tipFromAxis",
      label: "Tip from header axis",
      unit: "mm",
      decimals: 1,
      meaning: "From the header axis to the longest point of the branch, along the branch.",
    },
    {
      name: "insideRelief",
      label: "Inside relief",
      unit: "mm",
      decimals: 1,
      meaning: "The most by which the bore is cut deeper than the outside.",
    },
    {
      name: "templateWidth",
      label: "Wrap length",
      unit: "mm",
      decimals: 1,
      meaning: "Once round the branch, with the paper.",
    },
    {
      name: "weldLength",
      label: "Weld length",
      unit: "mm",
      decimals: 1,
      meaning: "Along the outside line, all the way round.",
    },
    {
      name: "holeSaw.diameter",
      label: "Hole saw",
      unit: "mm",
      decimals: 1,
      meaning: "Same diameter as the header.",
    },
    {
      name: "holeSaw.fromTip",
      label: "Saw centre from squared end",
      unit: "mm",
      decimals: 1,
      meaning: "Along the branch axis. Negative: the saw's centre lies beyond the end.",
    },
    {
      name: "holeSaw.angle",
      label: "Saw to tube",
      unit: "°",
      decimals: 1,
      meaning: "Between the saw's axis and the tube's axis.",
    },
    {
      name: "holeSaw.sideways",
      label: "Saw off centre",
      unit: "mm",
      decimals: 1,
      meaning: "How far the tube is set to the side of the saw's axis.",
    },
  ],
  cautions: [
    "This is a sum for the shape of a cut. It does not judge the strength of the joint or the weld: have a coded welder or an engineer do that for anything people ride in or stand under.",
    "Clamp the tube before you cut it. A hole saw grabs: run it slowly, with a side handle, and no gloves near it.",
    "Fresh edges cut. Deburr inside and out before you handle the tube or weld it.",
    "Grinding and welding are hot work: eyes, ears and lungs covered, nothing that burns nearby, a fire watch afterwards.",
    "Fit before you weld, and check the fit all round.",
  ],
  method: {
    formula: [
      "R = header diameter / 2,  r = branch diameter / 2,  e = offset,  θ = angle,  φ = place round the branch (0 at the heel)",
      "s(φ) = (r·cos φ·cos θ + √(R² − (r·sin φ + e)²)) / sin θ",
      "depth(φ) = s(φ) − least s",
      "inside line: the same with r − wall in place of r",
      "wrap length = π·(branch diameter + paper thickness)",
      "weld length = ∫ √(s′(φ)² + r²) dφ, once round",
    ],
    explanation:
      "A line along the outside of the branch, at φ from the heel, meets the outside of the header at s from the header's axis. The longest of these lines is the tip: a tube cut square there has to lose depth(φ) everywhere else. Angles are in radians under the integral; it is summed by 3600 chords.",
    sources: [
      "Analytic geometry of two cylinders, worked out here; compared in our tests with the cut edge from a general-purpose solid kernel, at five settings, to 0.05 mm.",
      "Rough-cut allowance of about an inch: common practice, no source.",
    ],
  },
});
