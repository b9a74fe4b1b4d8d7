import { z } from "zod";
import { choiceInput, numberInput } from "../inputs.ts";

/** Inputs of `fillet-weld`: mm, MPa, degrees. */
export const filletWeldInputs = z.strictObject({
  leg: numberInput({
    label: "Leg",
    unit: "mm",
    help: "Length of the weld's face along the plate, both alike. Give the leg or the throat.",
    min: 1,
    max: 60,
    step: 0.5,
    decimals: 1,
  }).optional(),
  throat: numberInput({
    label: "Throat",
    unit: "mm",
    help: "Height of the triangle of weld, from the root to the face. Give the leg or the throat.",
    min: 0.7,
    max: 45,
    step: 0.5,
    decimals: 1,
  }).optional(),
  length: numberInput({
    label: "Length",
    unit: "mm",
    help: "Full-size weld only: leave out a start and a stop that are not. The weld length of a saddle cope can go here.",
    min: 1,
    max: 100_000,
    step: 5,
    decimals: 0,
  }),
  ultimate: numberInput({
    label: "Ultimate strength",
    unit: "MPa",
    help: "Of the weaker of the two parts: 360 for S235, 430 for S275, 490 for S355 (EN 10219).",
    min: 200,
    max: 800,
    step: 10,
    decimals: 0,
  }),
  correlation: numberInput({
    label: "Correlation factor βw",
    unit: "",
    help: "0.8 for S235, 0.85 for S275, 0.9 for S355, 1.0 for S420 and S460.",
    min: 0.8,
    max: 1,
    step: 0.05,
    decimals: 2,
  }),
  gammaM2: numberInput({
    label: "Partial factor γM2",
    unit: "",
    help: "1.25 unless your national annex says otherwise.",
    min: 1,
    max: 2,
    step: 0.05,
    decimals: 2,
    minor: true,
  }).default(1.25),
  loadAngle: numberInput({
    label: "Load to weld",
    unit: "°",
    help: "0 along the weld, 90 across it. Only the directional method looks at it.",
    min: 0,
    max: 90,
    step: 5,
    decimals: 0,
  }).default(0),
  method: choiceInput({
    label: "Method",
    help: "Simplified takes the weld as if loaded along; directional credits a load across it.",
    choices: [
      { value: "simplified", label: "Simplified (4.5.3.3)" },
      { value: "directional", label: "Directional (4.5.3.2)" },
    ],
  }).default("simplified"),
});

export type FilletWeldInputs = z.output<typeof filletWeldInputs>;
