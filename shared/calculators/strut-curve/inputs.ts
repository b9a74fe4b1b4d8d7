import { z } from "zod";
import { choiceInput, numberInput } from "../inputs.ts";

/** Which buckling curve, as `strut` and `strut-curve` both ask. */
export const curveInput = choiceInput({
  label: "Buckling curve",
  help: "Hollow sections: a hot-finished (a0 in S460), c cold-formed. EN 1993-1-1, table 6.2.",
  choices: [
    { value: "a0", label: "a0" },
    { value: "a", label: "a" },
    { value: "b", label: "b" },
    { value: "c", label: "c" },
    { value: "d", label: "d" },
  ],
});

/** Inputs of `strut-curve`. */
export const strutCurveInputs = z.strictObject({
  curve: curveInput,
  slenderness: numberInput({
    label: "Relative slenderness",
    unit: "",
    help: "λ̄: the root of squash load over Euler load. 1 is where the two are equal.",
    min: 0,
    max: 10,
    step: 0.05,
    decimals: 3,
  }),
});

export type BucklingCurve = z.output<typeof curveInput>;
export type StrutCurveInputs = z.output<typeof strutCurveInputs>;
