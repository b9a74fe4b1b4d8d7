import { z } from "zod";
import { numberInput } from "../inputs.ts";
import { curveInput } from "../strut-curve/inputs.ts";
import { sectionFields } from "../tube-section/inputs.ts";

/** Inputs of `strut`: mm, MPa. */
export const strutInputs = z.strictObject({
  ...sectionFields,
  length: numberInput({
    label: "Length",
    unit: "mm",
    help: "Between the points that hold it sideways.",
    min: 1,
    max: 30_000,
    step: 10,
    decimals: 0,
  }),
  effectiveLengthFactor: numberInput({
    label: "Effective length factor",
    unit: "",
    help: "1 with both ends free to turn and held sideways, 2 with one end fixed and the other free in every way. Below 1 only where the ends truly cannot turn.",
    min: 0.5,
    max: 3,
    step: 0.05,
    decimals: 2,
  }).default(1),
  yield: numberInput({
    label: "Yield strength",
    unit: "MPa",
    help: "235 for S235, 275 for S275, 355 for S355. Plain tube without a certificate: take 235 or less.",
    min: 100,
    max: 700,
    step: 5,
    decimals: 0,
  }),
  modulus: numberInput({
    label: "Modulus",
    unit: "MPa",
    help: "210000 for steel. The curves are for steel only.",
    min: 180_000,
    max: 220_000,
    step: 1000,
    decimals: 0,
    minor: true,
  }).default(210_000),
  curve: curveInput,
  gammaM1: numberInput({
    label: "Partial factor γM1",
    unit: "",
    help: "1.0 unless your national annex says otherwise.",
    min: 1,
    max: 2,
    step: 0.05,
    decimals: 2,
    minor: true,
  }).default(1),
});

export type StrutInputs = z.output<typeof strutInputs>;
