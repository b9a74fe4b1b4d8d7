import { z } from "zod";
import { numberInput, pointInput } from "../inputs.ts";

const radius = numberInput({
  label: "Bend radius",
  unit: "mm",
  help: "To the tube's centreline, as stamped on the die.",
  min: 1,
  max: 5000,
  step: 1,
  decimals: 1,
});

/** Inputs of `tube-bend`: mm and degrees. */
export const tubeBendInputs = z.strictObject({
  points: z
    .array(
      pointInput({
        label: "Point",
        help: "Where two straights of the centreline would meet, or an end.",
        axes: ["x", "y", "z"],
        min: -50_000,
        max: 50_000,
        step: 1,
      }),
      { error: "Give the points as a list of [x, y, z] in mm." },
    )
    .min(3, "A bent tube needs at least 3 points: two ends and one corner.")
    .max(40, "Give at most 40 points: work a longer tube in parts.")
    .meta({ label: "Points", help: "Along the centreline: one end, the corners in order, the other end." }),
  bendRadius: z
    .union(
      [radius, z.array(radius).min(1, "Give at least 1 bend radius.").max(38, "Give at most 38 bend radii.")],
      {
        error: "Give the bend radius as a number in mm, or as a list with one for each bend.",
      },
    )
    .meta({ label: "Bend radius", help: "One for all bends, or one for each." }),
  od: numberInput({
    label: "Outside diameter",
    unit: "mm",
    help: "Of the tube.",
    min: 2,
    max: 1000,
    step: 0.1,
    decimals: 2,
  }),
  wall: numberInput({
    label: "Wall",
    unit: "mm",
    help: "Wall thickness of the tube.",
    min: 0.2,
    max: 100,
    step: 0.1,
    decimals: 2,
  }),
  endAllowance: numberInput({
    label: "End allowance",
    unit: "mm",
    help: "Spare to leave at each end, for the clamp and for trimming.",
    min: 0,
    max: 2000,
    step: 1,
    decimals: 1,
  }).default(0),
  springback: numberInput({
    label: "Springback",
    unit: "° in 90°",
    help: "How far a bend of 90° opens when you let go. Measure it on an offcut of the same tube.",
    min: 0,
    max: 20,
    step: 0.1,
    decimals: 1,
  }).default(0),
  density: numberInput({
    label: "Density",
    unit: "kg/m³",
    help: "7850 for steel, about 2700 for aluminium.",
    min: 500,
    max: 25_000,
    step: 50,
    decimals: 0,
    minor: true,
  }).default(7850),
});

export type TubeBendInputs = z.output<typeof tubeBendInputs>;
