import { z } from "zod";
import { numberInput } from "../inputs.ts";

const scalePad = (label: string) =>
  numberInput({
    label,
    unit: "kg",
    help: "What the scale under this wheel shows, driver in or ballast for one.",
    min: 0,
    max: 20_000,
    step: 0.5,
    decimals: 1,
  });

const length = (label: string, help: string, min: number, max: number) =>
  numberInput({ label, help, unit: "mm", min, max, step: 1, decimals: 1 });

const liftedInputs = z
  .strictObject(
    {
      height: length(
        "Rear raised by",
        "How much higher the rear wheels stand than the front ones.",
        20,
        5000,
      ),
      frontMass: numberInput({
        label: "Front scales then",
        unit: "kg",
        help: "Both front scales together with the rear raised.",
        min: 0,
        max: 40_000,
        step: 0.5,
        decimals: 1,
      }),
      loadedRadius: length("Loaded radius", "From the wheel centre to the ground.", 50, 1000),
    },
    { error: "Give the second weighing as height, frontMass and loadedRadius, or leave it out." },
  )
  .meta({ label: "Rear raised", help: "Second weighing, to find how high the centre of gravity is." });

/** Inputs of `corner-weights`: kg and mm. */
export const cornerWeightsInputs = z.strictObject({
  lf: scalePad("Left front"),
  rf: scalePad("Right front"),
  lr: scalePad("Left rear"),
  rr: scalePad("Right rear"),
  wheelbase: length("Wheelbase", "Between the wheel centres of front and rear.", 200, 12_000),
  frontTrack: length("Front track", "Between the middles of the tyres.", 100, 4000),
  rearTrack: length("Rear track", "Between the middles of the tyres.", 100, 4000),
  lifted: liftedInputs.optional(),
});

export type CornerWeightsInputs = z.output<typeof cornerWeightsInputs>;
