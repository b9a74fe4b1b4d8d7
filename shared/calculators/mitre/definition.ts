import { defineCalculator } from "../definition.ts";
import { mitre as compute } from "./formula.ts";
import { mitreMarks } from "./hand-marks.ts";
import { mitreInputs } from "./inputs.ts";
import { mitreTemplate } from "./template.ts";

/** Two equal tubes that meet in a plane cut. */
export const mitre = defineCalculator({
  id: "mitre",
  version: 1,
  name: "Mitre",
  purpose: "Mark and cut two equal round tubes so that they meet in a corner.",
  group: "Joining tubes",
  words: ["mitre", "miter", "corner", "elbow", "plane cut", "wrap template", "tube joint", "saw angle"],
  inputs: mitreInputs,
  example: { od: 44.5, wall: 2.5, turn: 90 },
  compute,
  template: mitreTemplate,
  steps: mitreMarks,
  resultFields: [
    {
      name: "cutAngle",
      label: "Saw angle",
      unit: "°",
      decimals: 2,
      meaning: "From a square cut. The same on both tubes.",
    },
    {
      name: "deepest",
      label: "Deepest cut",
      unit: "mm",
      decimals: 1,
      meaning: "At the heel, from the squared end.",
    },
    {
      name: "sideDepth.at90",
      label: "Depth at the sides",
      unit: "mm",
      decimals: 1,
      meaning: "A quarter turn from the heel, both ways.",
    },
    {
      name: "tipFromAxis",
      label: "Tip from crossing",
      unit: "mm",
      decimals: 1,
      meaning: "From where the axes cross to the longest point. Negative: the toe reaches past the crossing.",
    },
    {
      name: "templateWidth",
      label: "Wrap length",
      unit: "mm",
      decimals: 1,
      meaning: "Once round the tube, with the paper.",
    },
    {
      name: "weldLength",
      label: "Weld length",
      unit: "mm",
      decimals: 1,
      meaning: "Along the outside, all the way round.",
    },
  ],
  cautions: [
    "This is a sum for the shape of a cut. It does not judge the strength of the joint or the weld: have a coded welder or an engineer do that for anything people ride in or stand under.",
    "Clamp the tube before you cut it: a steep cut wants to walk. Fresh edges cut, so deburr inside and out.",
    "Fit before you weld, and check the turn: a corner pulls in as its weld cools.",
  ],
  method: {
    formula: [
      "r = outside diameter / 2,  φ = place round the tube (0 on the inside of the corner)",
      "depth(φ) = r·(1 + cos φ)·tan(turn/2)",
      "cut angle = turn/2",
      "weld length = perimeter of the ellipse with half axes r and r / cos(turn/2)",
    ],
    explanation:
      "The cut lies in the plane that halves the corner. It is deepest on the inside of the corner, the heel, and nothing at the toe. On the bore the same with r − wall in the cosine.",
    sources: [
      "Analytic geometry of a cylinder cut by a plane; compared in our tests with a general-purpose solid kernel to 0.05 mm.",
    ],
  },
});
