import { z } from "zod";
import { numberInput } from "../inputs.ts";
import { tappedThreads } from "./designation.ts";

const thread = {
  label: "Thread",
  help: "As it stands on the tap: M10, M10x1.25, 1/4-20 UNC, #10-32 UNF.",
  choices: tappedThreads.map(({ designation }) => ({ value: designation, label: designation })),
};

/** Inputs of `tap-drill`. The thread is matched by `findThread`, which forgives spellings, so any text passes here. */
export const tapDrillInputs = z.strictObject({
  thread: z
    .string({ error: 'Give the thread as it stands on the tap, such as "M10" or "1/4-20 UNC".' })
    .max(40, "A thread's name is short, such as M10x1.25.")
    .meta({ kind: "choice", ...thread }),
  engagement: numberInput({
    label: "Thread engagement",
    unit: "%",
    help: "How full the thread in the hole is. 75 is common practice; 60 to 65 eases tapping tough steel by hand.",
    min: 40,
    max: 83,
    step: 1,
    decimals: 0,
  }).default(75),
});

export type TapDrillInputs = z.output<typeof tapDrillInputs>;
