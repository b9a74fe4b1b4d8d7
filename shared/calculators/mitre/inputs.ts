import { z } from "zod";
import { countInput, numberInput } from "../inputs.ts";

/** Inputs of `mitre`: lengths in mm, angle in degrees. */
export const mitreInputs = z.strictObject({
  od: numberInput({
    label: "Outside diameter",
    unit: "mm",
    help: "Of both tubes: they are alike.",
    min: 3,
    max: 2000,
    step: 0.1,
    decimals: 2,
  }),
  wall: numberInput({
    label: "Wall",
    unit: "mm",
    help: "Wall thickness of both tubes.",
    min: 0.2,
    max: 200,
    step: 0.1,
    decimals: 2,
  }),
  turn: numberInput({
    label: "Turn",
    unit: "°",
    help: "How far the second tube turns off the line of the first. 90 makes a square corner.",
    min: 1,
    max: 150,
    step: 0.5,
    decimals: 2,
  }),
  paperThickness: numberInput({
    label: "Paper thickness",
    unit: "mm",
    help: "Makes the wrap a touch longer, so that it meets. Office paper is about 0.1.",
    min: 0,
    max: 3,
    step: 0.05,
    decimals: 2,
    minor: true,
  }).default(0.1),
  samples: countInput({
    label: "Points round the tube",
    unit: "",
    help: "How many steps the listed curve has. It does not move the other numbers.",
    min: 8,
    max: 720,
    step: 4,
    minor: true,
  }).default(72),
});

export type MitreInputs = z.output<typeof mitreInputs>;
