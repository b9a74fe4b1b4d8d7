import { defineCalculator, type ResultField } from "../definition.ts";
import { tubeBend as compute } from "./formula.ts";
import { tubeBendInputs } from "./inputs.ts";

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

/** From the points of a tube's centreline to a bender's sheet. */
export const tubeBendCalculator = defineCalculator({
  id: "tube-bend",
  version: 1,
  name: "Tube bend",
  purpose:
    "Turn the points of a tube's centreline into the lengths, rotations and bends a bender works from.",
  group: "Bending",
  words: [
    "bender's sheet",
    "tube bender",
    "bend schedule",
    "centreline radius",
    "CLR",
    "rotation",
    "developed length",
    "roll hoop",
    "springback",
    "main tube",
  ],
  inputs: tubeBendInputs,
  example: {
    points: [
      [0, 0, 0],
      [420, 0, 0],
      [700, 260, 0],
      [1150, 260, 180],
    ],
    bendRadius: 120,
    od: 38,
    wall: 2,
    endAllowance: 40,
    springback: 3,
  },
  compute,
  resultFields: [
    field(
      "cutLength",
      "Cut length",
      "mm",
      1,
      "Saw the tube to this: the centreline and the allowance at both ends.",
    ),
    field("developedLength", "Developed length", "mm", 1, "Length of the centreline."),
    field("straights.0", "First straight", "mm", 1, "From the finished end to the first bend."),
    field("startMarks.0", "First bend begins at", "mm", 1, "From the cut end."),
    field("bends.0", "First bend", "°", 1, "What the finished tube turns through."),
    field("settings.0", "Bend it to", "°", 1, "With springback."),
    field("arcs.0", "First arc", "mm", 1, "Length of centreline in the first bend."),
    field(
      "outsideWall",
      "Wall outside the bend",
      "mm",
      2,
      "At the tightest bend, if the middle keeps its length.",
    ),
    field("mass", "Mass", "kg", 2, "Of the cut tube."),
  ],
  cautions: [
    "This is a sum for a shape. It does not judge the strength of the tube: have an engineer do that for anything people ride in or rely on, a roll hoop above all.",
    "Bend a trial piece first. Springback and the place where a bend truly begins belong to your bender and your tube.",
    "Hands clear of die and clamp. A tube that slips out of the clamp whips.",
    "Look at each bend for cracks, wrinkles and flattening. Scrap it rather than weld over it.",
  ],
  method: {
    formula: [
      "bend A = angle between one straight and the next",
      "setback = R·tan(A/2),  straight = distance between points − setbacks at its ends",
      "arc = π/180·A·R,  developed length = Σ straights + Σ arcs",
      "rotation = angle from the last bend's plane to this one's, right-handed about the straight between",
      "bend it to A·(1 + springback/90)",
      "cut length = developed length + 2·allowance,  marks are measured from the cut end",
      "wall outside the bend ≈ wall·R / (R + diameter/2)",
    ],
    explanation:
      "R is the radius to the centreline. Stand behind the tube and look along it the way it is fed: a positive rotation turns it clockwise before the next bend. The first end listed is bent first.",
    sources: [
      "Analytic geometry, worked out here; our tests rebuild the points from straights, rotations and bends.",
      "Twice the diameter as the least radius, and the middle keeping its length: common practice, no source.",
    ],
  },
});
