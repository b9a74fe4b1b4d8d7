import { z } from "zod";
import { numberInput } from "../inputs.ts";

const length = (label: string, help: string) =>
  numberInput({ label, help, unit: "mm", min: -600, max: 600, step: 0.5, decimals: 1 });

const joint = (which: string) =>
  z
    .strictObject(
      {
        out: length(`${which} joint, out`, "From the wheel's mounting face. Inboard is negative."),
        up: length(`${which} joint, up`, "Above the hub's centre. Below is negative."),
        fore: length(`${which} joint, fore`, "Ahead of the hub's centre. Behind is negative."),
      },
      { error: `Give the ${which.toLowerCase()} joint as out, up and fore in mm.` },
    )
    .meta({ label: `${which} joint`, help: "Centre of the ball or bearing, measured on the bench." });

/** Inputs of `steering-axis`: mm and degrees, a left wheel, spindle level and square across the car. */
export const steeringAxisInputs = z.strictObject({
  lower: joint("Lower"),
  upper: joint("Upper"),
  wheelOffset: numberInput({
    label: "Wheel offset (ET)",
    unit: "mm",
    help: "How far the rim's middle lies inboard of its mounting face.",
    min: -200,
    max: 200,
    step: 1,
    decimals: 1,
  }),
  loadedRadius: numberInput({
    label: "Loaded radius",
    unit: "mm",
    help: "From the wheel centre to the ground, car standing.",
    min: 50,
    max: 1000,
    step: 1,
    decimals: 1,
  }),
  camber: numberInput({
    label: "Camber",
    unit: "°",
    help: "Positive: the top of the wheel leans out.",
    min: -15,
    max: 15,
    step: 0.1,
    decimals: 2,
  }).default(0),
  turnedOver: z
    .boolean({ error: "Turned over is either true or false." })
    .meta({ label: "Turned over", help: "The upright given half a turn about its spindle." })
    .default(false),
});

export type SteeringAxisInputs = z.output<typeof steeringAxisInputs>;
