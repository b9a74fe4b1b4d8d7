import { z } from "zod";
import { choiceInput, numberInput } from "../inputs.ts";

function size(label: string, help: string) {
  return numberInput({ label, unit: "mm", help, min: 3, max: 2000, step: 1, decimals: 1 }).optional();
}

/** The inputs that describe a tube's section, as `tube-section` and `strut` both ask. Lengths in mm. */
export const sectionFields = {
  shape: choiceInput({
    label: "Shape",
    help: "What the tube looks like from its end.",
    choices: [
      { value: "round", label: "Round" },
      { value: "square", label: "Square" },
      { value: "rectangle", label: "Rectangle" },
    ],
  }),
  od: size("Outside diameter", "Of a round tube."),
  side: size("Side", "Of a square tube, outside."),
  width: size("Width", "Of a rectangular tube, outside."),
  height: size("Height", "Of a rectangular tube, outside."),
  wall: numberInput({
    label: "Wall",
    unit: "mm",
    help: "Wall thickness.",
    min: 0.2,
    max: 100,
    step: 0.1,
    decimals: 2,
  }),
  corners: choiceInput({
    label: "Corners",
    help: "How a square or rectangular tube was made. Most thin tube is cold-formed.",
    choices: [
      { value: "cold-formed", label: "Cold-formed (EN 10219-2)" },
      { value: "hot-finished", label: "Hot-finished (EN 10210-2)" },
      { value: "sharp", label: "Sharp, no radius" },
    ],
  }).default("cold-formed"),
};

/** Inputs of `tube-section`. Of the sizes only those of the shape are looked at. */
export const tubeSectionInputs = z.strictObject({
  ...sectionFields,
  density: numberInput({
    label: "Density",
    unit: "kg/m³",
    help: "7850 for steel, about 2700 for aluminium.",
    min: 500,
    max: 25_000,
    step: 50,
    decimals: 0,
    minor: true,
  }).default(7850),
});

export type TubeSectionInputs = z.output<typeof tubeSectionInputs>;
/** The part of the inputs that gives the section its shape. */
export type SectionInputs = Omit<TubeSectionInputs, "density">;
