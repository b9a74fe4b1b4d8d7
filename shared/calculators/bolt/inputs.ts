import { z } from "zod";
import { choiceInput, numberInput } from "../inputs.ts";
import { boltGrades, boltSizes } from "./grades.ts";

/** Inputs of `bolt`. */
export const boltInputs = z.strictObject({
  size: choiceInput({
    label: "Size",
    help: "The bolt's outside diameter.",
    choices: boltSizes.map((value) => ({ value, label: value })),
  }),
  pitch: numberInput({
    label: "Pitch",
    unit: "mm",
    help: "Leave it out for the coarse pitch, which is what most bolts have.",
    min: 0.3,
    max: 6,
    step: 0.25,
    decimals: 2,
  }).optional(),
  grade: choiceInput({
    label: "Grade",
    help: "The two numbers on the head. A bolt without them has no grade.",
    choices: boltGrades.map(({ grade }) => ({ value: grade, label: grade })),
  }),
  threadsInShear: z
    .boolean({ error: "Threads in shear is yes or no: true or false." })
    .meta({
      label: "Threads in the shear plane",
      help: "Off only when the plain shank fills the hole where the plates slide.",
    })
    .default(true),
  frictionFactor: numberInput({
    label: "Friction factor K",
    unit: "",
    help: "Takes in thread and head friction. 0.2 dry as bought, about 0.15 oiled: common practice, no source.",
    min: 0.08,
    max: 0.4,
    step: 0.01,
    decimals: 2,
  }).default(0.2),
  preloadFraction: numberInput({
    label: "Preload",
    unit: "",
    help: "Part of the proof load to tighten to. 0.75 is common practice for a joint that comes apart again.",
    min: 0.1,
    max: 0.9,
    step: 0.05,
    decimals: 2,
  }).default(0.75),
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
});

export type BoltInputs = z.output<typeof boltInputs>;
