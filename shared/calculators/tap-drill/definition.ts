import { defineCalculator } from "../definition.ts";
import { tapDrill as compute } from "./formula.ts";
import { tapDrillInputs } from "./inputs.ts";

/** The hole to drill before tapping, and the holes that clear the screw. */
export const tapDrill = defineCalculator({
  id: "tap-drill",
  version: 1,
  name: "Tap drill",
  purpose: "Find the drill for a tapped hole, and the clearance holes for its screw.",
  group: "Threads and bolts",
  words: [
    "tap",
    "tapping drill",
    "thread",
    "clearance hole",
    "pilot hole",
    "UNC",
    "UNF",
    "metric thread",
    "pitch",
  ],
  inputs: tapDrillInputs,
  example: { thread: "M8" },
  compute,
  resultFields: [
    {
      name: "drill",
      label: "Exact hole",
      unit: "mm",
      decimals: 2,
      meaning: "Gives just the engagement asked for.",
    },
    {
      name: "standardDrill",
      label: "Drill to use",
      unit: "mm",
      decimals: 2,
      meaning: "The nearest drill that can be bought.",
    },
    {
      name: "standardDrillEngagement",
      label: "Engagement with it",
      unit: "%",
      decimals: 0,
      meaning: "How full the thread is with that drill.",
    },
    {
      name: "minor",
      label: "Minor diameter",
      unit: "mm",
      decimals: 3,
      meaning: "Basic minor diameter of the nut thread.",
    },
    {
      name: "clearance.close",
      label: "Close hole",
      unit: "mm",
      decimals: 2,
      meaning: "Clears the screw closely.",
    },
    { name: "clearance.medium", label: "Medium hole", unit: "mm", decimals: 2, meaning: "The usual hole." },
    {
      name: "clearance.free",
      label: "Free hole",
      unit: "mm",
      decimals: 2,
      meaning: "For rough work that must line up.",
    },
    {
      name: "stressArea",
      label: "Stress area",
      unit: "mm²",
      decimals: 1,
      meaning: "Of the screw; its strength is reckoned on this.",
    },
  ],
  cautions: [
    "Clamp the work: a drill that breaks through grabs it. Eyes covered, no gloves near the spindle.",
    "Drills cut oversize. Try the drill and tap in an offcut first where the thread has to hold a load.",
  ],
  method: {
    formula: [
      "hole = D − P·engagement / 76.98",
      "minor diameter D1 = D − 1.0825·P",
      "stress area, metric = π/4·(D − 0.9382·P)²; unified = π/4·(D − 0.9743·P)²",
    ],
    explanation:
      "D is the outside diameter of the screw and P its pitch, 25.4 mm over the threads per inch for unified ones. 76.98 is 100 over twice 0.6495, the height of a full thread in pitches. For metric threads the drill of ISO 2306 is named when it comes within 5 points of the engagement asked for, otherwise the nearest drill made; for unified threads the nearest number, letter or fraction drill.",
    sources: [
      "ISO 261 and ISO 724: metric threads. ISO 898-1: stress area. ISO 273: clearance holes. ISO 2306: tapping drills.",
      "ASME B1.1: unified threads and their stress area. ASME B18.2.8: clearance holes. ASME B94.11M: drills.",
      "Engagement of 75 %: common practice, no source.",
    ],
  },
});
