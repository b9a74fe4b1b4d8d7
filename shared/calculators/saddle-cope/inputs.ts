import { z } from "zod";
import { countInput, numberInput } from "../inputs.ts";

/** Inputs of `saddle-cope`: lengths in mm, angle in degrees. */
export const saddleCopeInputs = z.strictObject({
  headerOd: numberInput({
    label: "Header outside diameter",
    unit: "mm",
    help: "The tube that stays whole.",
    min: 3,
    max: 2000,
    step: 0.1,
    decimals: 2,
  }),
  branchOd: numberInput({
    label: "Branch outside diameter",
    unit: "mm",
    help: "The tube whose end is cut.",
    min: 3,
    max: 2000,
    step: 0.1,
    decimals: 2,
  }),
  branchWall: numberInput({
    label: "Branch wall",
    unit: "mm",
    help: "Of the branch tube.",
    min: 0.2,
    max: 200,
    step: 0.1,
    decimals: 2,
  }),
  angle: numberInput({
    label: "Angle between the axes",
    unit: "°",
    help: "90 is square.",
    min: 15,
    max: 90,
    step: 0.5,
    decimals: 2,
  }),
  offset: numberInput({
    label: "Offset",
    unit: "mm",
    help: "Axes apart; + toward 90° side.",
    min: -1000,
    max: 1000,
    step: 0.5,
    decimals: 2,
  }).default(0),
  paperThickness: numberInput({
    label: "Paper thickness",
    unit: "mm",
    help: "Office paper is about 0.1.",
    min: 0,
    max: 3,
    step: 0.05,
    decimals: 2,
    minor: true,
  }).default(0.1),
  allowance: numberInput({
    label: "Rough-cut allowance",
    unit: "mm",
    help: "About an inch is usual.",
    min: 0,
    max: 500,
    step: 1,
    decimals: 1,
    minor: true,
  }).default(25),
  samples: countInput({
    label: "Points round the tube",
    unit: "",
    help: "Of the listed curve only.",
    min: 8,
    max: 720,
    step: 4,
    minor: true,
  }).default(72),
});

export type SaddleCopeInputs = z.output<typeof saddleCopeInputs>;
