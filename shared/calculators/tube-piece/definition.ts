import { defineCalculator } from "../definition.ts";
import { tubePiece as compute } from "./formula.ts";
import { pieceMarks } from "./hand-marks.ts";
import { tubePieceInputs } from "./inputs.ts";
import { pieceTemplate } from "./template.ts";

/** One round tube between two joints, both ends worked together. */
export const tubePiece = defineCalculator({
  id: "tube-piece",
  version: 1,
  name: "Tube piece",
  purpose: "Cut one round tube to length with both its ends fitted and turned to each other.",
  group: "Joining tubes",
  words: [
    "cut length",
    "both ends",
    "clocking",
    "notch",
    "cope",
    "brace",
    "cross tube",
    "tube between",
    "saddle",
  ],
  inputs: tubePieceInputs,
  example: {
    between: 600,
    branchOd: 38.1,
    branchWall: 2.5,
    ends: [
      { kind: "saddle", headerOd: 44.5, angle: 60 },
      { kind: "saddle", headerOd: 44.5, angle: 90 },
    ],
    clock: 90,
  },
  compute,
  template: pieceTemplate,
  steps: pieceMarks,
  resultFields: [
    {
      name: "tipToTip",
      label: "Tip to tip",
      unit: "mm",
      decimals: 1,
      meaning: "Finished length, from the longest point of one end to that of the other.",
    },
    {
      name: "roughCut",
      label: "Rough cut",
      unit: "mm",
      decimals: 1,
      meaning: "Saw the tube to this first.",
    },
    {
      name: "shortest",
      label: "Shortest line",
      unit: "mm",
      decimals: 1,
      meaning: "Along the outside, where the two cuts come nearest.",
    },
    {
      name: "ends.0.deepest",
      label: "Deepest cut, end A",
      unit: "mm",
      decimals: 1,
      meaning: "From A's squared end.",
    },
    {
      name: "ends.1.deepest",
      label: "Deepest cut, end B",
      unit: "mm",
      decimals: 1,
      meaning: "From B's squared end.",
    },
    {
      name: "ends.0.tipFromAxis",
      label: "Tip from joint, end A",
      unit: "mm",
      decimals: 1,
      meaning: "From the joint's axis to A's longest point. Negative reaches past it.",
    },
    {
      name: "ends.1.tipFromAxis",
      label: "Tip from joint, end B",
      unit: "mm",
      decimals: 1,
      meaning: "From the joint's axis to B's longest point. Negative reaches past it.",
    },
    {
      name: "strip.heelB",
      label: "B's heel from the datum",
      unit: "mm",
      decimals: 1,
      meaning: "Along the wrap, from A's heel line, left to right with A up.",
    },
    {
      name: "strip.width",
      label: "Wrap length",
      unit: "mm",
      decimals: 1,
      meaning: "Once round the tube, with the paper.",
    },
    { name: "mass", label: "Mass", unit: "kg", decimals: 3, meaning: "Of the finished piece." },
  ],
  cautions: [
    "This is a sum for the shape of the cuts. It does not judge the strength of the joints: have a coded welder or an engineer do that for anything people ride in or stand under.",
    "Cut the hard end first and try it. Then mark the other end from the work itself, and trim that last.",
    "Scribe the datum line along the whole tube before you cut: the clock is lost with it.",
    "Clamp the tube. Fresh edges cut, so deburr inside and out.",
  ],
  method: {
    formula: [
      "saddle: s(φ) as in the saddle cope;  mitre: s(φ) = r·cos φ·tan(turn/2);  square: s = setback",
      "tip = least s;  tip to tip = between − tip A − tip B",
      "line at φ = between − sA(φ) − sB(clock − φ);  shortest = the least of these",
      "rough cut = tip to tip + allowance",
      "mass = density·∫∫ line·r dr dφ through the wall",
    ],
    explanation:
      "s is the distance from a joint's axis to the cut, along the tube. Places φ run counter-clockwise from A's heel, looking from A to B. B's own places run the other way, because its end is looked at from the other side. The hard end is the one with the deeper cut.",
    sources: [
      "Analytic geometry, worked out here; compared in our tests with a general-purpose solid kernel to 0.05 mm.",
      "Hard end first, and about an inch over: common practice, no source.",
    ],
  },
});
