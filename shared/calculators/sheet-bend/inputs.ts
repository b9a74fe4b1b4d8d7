import { z } from "zod";
import { numberInput } from "../inputs.ts";

/** Inputs of `sheet-bend`: mm and degrees. */
export const sheetBendInputs = z.strictObject({
  flanges: z
    .array(
      numberInput({
        label: "Flange",
        unit: "mm",
        help: "Outside length, to where the outside faces would meet.",
        min: 0.5,
        max: 10_000,
        step: 1,
        decimals: 1,
      }),
      { error: "Give the flanges as a list of outside lengths in mm." },
    )
    .min(2, "A bend needs a flange on either side: give at least 2.")
    .max(20, "Give at most 20 flanges: work longer profiles in parts.")
    .meta({ label: "Flanges", help: "Outside lengths, one after the other along the strip." }),
  angles: z
    .array(
      numberInput({
        label: "Bend angle",
        unit: "°",
        help: "What the sheet is turned through: 90 makes a right angle. Negative bends the other way.",
        min: -150,
        max: 150,
        step: 1,
        decimals: 1,
      }).refine(
        (angle) => Math.abs(angle) >= 1,
        "A bend turns through at least 1°: leave it out if the sheet stays flat.",
      ),
      { error: "Give the angles as a list in degrees, one for each bend." },
    )
    .min(1, "Give the angle of at least 1 bend.")
    .max(19, "Give at most 19 bends: work longer profiles in parts.")
    .meta({ label: "Angles", help: "One between each flange and the next." }),
  thickness: numberInput({
    label: "Thickness",
    unit: "mm",
    help: "Measured, not the nominal gauge.",
    min: 0.2,
    max: 40,
    step: 0.1,
    decimals: 2,
  }),
  insideRadius: numberInput({
    label: "Inside radius",
    unit: "mm",
    help: "As the bend comes out on your tools.",
    min: 0,
    max: 500,
    step: 0.5,
    decimals: 2,
  }),
  kFactor: numberInput({
    label: "K-factor",
    unit: "",
    help: "Where the sheet keeps its length: from the inside face, in thicknesses. About 0.33 tight in soft metal, 0.45 in mild steel, 0.5 at large radii. A test bend tells.",
    min: 0.2,
    max: 0.5,
    step: 0.01,
    decimals: 3,
  }),
});

export type SheetBendInputs = z.output<typeof sheetBendInputs>;
