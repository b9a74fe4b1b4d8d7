import { z } from "zod";
import { countInput, numberInput, textInput } from "../inputs.ts";

const length = (label: string, help: string, min: number) =>
  numberInput({ label, help, unit: "mm", min, max: 20_000, step: 1, decimals: 1 });

const pieceInputs = z
  .strictObject(
    {
      label: textInput({ label: "Mark", help: "What is written on the piece.", maxLength: 40 }).default(""),
      length: length("Piece length", "As cut, rough-cut allowance included.", 1),
      count: countInput({
        label: "Pieces",
        help: "How many of this length.",
        unit: "",
        min: 1,
        max: 1000,
        step: 1,
      }).default(1),
    },
    { error: "Give each piece as label, length in mm and count." },
  )
  .meta({ label: "Piece", help: "" });

const barInputs = z
  .strictObject(
    {
      length: length("Bar length", "As it lies on the rack.", 10),
      count: countInput({
        label: "Bars",
        help: "How many you have. Left out: as many as it takes.",
        unit: "",
        min: 0,
        max: 1000,
        step: 1,
      }).optional(),
      price: numberInput({
        label: "Price",
        help: "Of one bar. Give it for all lengths or for none. 0 for offcuts you have.",
        unit: "",
        min: 0,
        max: 100_000,
        step: 1,
        decimals: 2,
      }).optional(),
    },
    { error: "Give each bar as length in mm, and count and price if you like." },
  )
  .meta({ label: "Bar", help: "" });

/** Inputs of `stock-cutting`: mm. */
export const stockCuttingInputs = z.strictObject({
  pieces: z
    .array(pieceInputs, { error: "Give the pieces as a list, each with label, length and count." })
    .min(1, "Give at least 1 piece.")
    .max(40, "Give at most 40 different pieces: cut the rest from another lot.")
    .meta({ label: "Pieces", help: "The cut list." }),
  stock: z
    .array(barInputs, { error: "Give the stock as a list, each with length." })
    .min(1, "Give at least 1 bar length.")
    .max(8, "Give at most 8 bar lengths.")
    .meta({ label: "Stock", help: "Bars you have or can buy." }),
  kerf: numberInput({
    label: "Kerf",
    unit: "mm",
    help: "Width of the saw's cut: about 1 for a bandsaw, 2 to 3 for a chop saw.",
    min: 0,
    max: 20,
    step: 0.1,
    decimals: 1,
  }).default(2),
  trim: numberInput({
    label: "Trim",
    unit: "mm",
    help: "What each bar loses to square up its ends, both together.",
    min: 0,
    max: 500,
    step: 1,
    decimals: 1,
  }).default(0),
});

export type StockCuttingInputs = z.output<typeof stockCuttingInputs>;
