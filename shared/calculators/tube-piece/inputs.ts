import { z } from "zod";
import { choiceInput, countInput, numberInput } from "../inputs.ts";

/** One end of the piece. Which of the numbers count depends on `kind`; the others may stay as they are. */
const endInputs = z
  .strictObject({
    kind: choiceInput({
      label: "End",
      help: "Saddle on the side of another tube, square, or mitre with an equal tube.",
      choices: [
        { value: "saddle", label: "Saddle" },
        { value: "square", label: "Square" },
        { value: "mitre", label: "Mitre" },
      ],
    }),
    headerOd: numberInput({
      label: "Header outside diameter",
      unit: "mm",
      help: "Saddle: the tube that this end sits on.",
      min: 3,
      max: 2000,
      step: 0.1,
      decimals: 2,
    }).optional(),
    angle: numberInput({
      label: "Angle between the axes",
      unit: "°",
      help: "Saddle: 90 is square. The heel is on the acute side.",
      min: 15,
      max: 90,
      step: 0.5,
      decimals: 2,
    }).optional(),
    offset: numberInput({
      label: "Offset",
      unit: "mm",
      help: "Saddle: how far this tube's axis passes clear of the header's. Positive toward the 90° side.",
      min: -1000,
      max: 1000,
      step: 0.5,
      decimals: 2,
    }).default(0),
    turn: numberInput({
      label: "Turn",
      unit: "°",
      help: "Mitre: how far the next tube turns off the line of this one.",
      min: 1,
      max: 150,
      step: 0.5,
      decimals: 2,
    }).optional(),
    setback: numberInput({
      label: "Setback",
      unit: "mm",
      help: "Square: how far short of the joint's axis the end stops. Negative runs past it.",
      min: -5000,
      max: 5000,
      step: 1,
      decimals: 1,
    }).default(0),
  })
  .meta({ label: "End", help: "" });

/** Inputs of `tube-piece`: lengths in mm, angles in degrees. */
export const tubePieceInputs = z.strictObject({
  between: numberInput({
    label: "Distance between",
    unit: "mm",
    help: "From axis to axis of the two joints, along this tube's own axis.",
    min: 1,
    max: 20_000,
    step: 1,
    decimals: 1,
  }),
  branchOd: numberInput({
    label: "Outside diameter",
    unit: "mm",
    help: "Of this tube.",
    min: 3,
    max: 2000,
    step: 0.1,
    decimals: 2,
  }),
  branchWall: numberInput({
    label: "Wall",
    unit: "mm",
    help: "Wall thickness of this tube.",
    min: 0.2,
    max: 200,
    step: 0.1,
    decimals: 2,
  }),
  ends: z
    .array(endInputs, { error: "Give the two ends as a list: A, then B." })
    .length(2, "A piece has two ends: give A, then B.")
    .meta({ label: "Ends", help: "A, then B." }),
  clock: numberInput({
    label: "Clock",
    unit: "°",
    help: "Turn of B's heel from A's heel, looking from A to B. Positive is counter-clockwise.",
    min: -360,
    max: 360,
    step: 1,
    decimals: 1,
  }).default(0),
  allowance: numberInput({
    label: "Rough-cut allowance",
    unit: "mm",
    help: "Spare length to leave before the ends are cut. About an inch is common practice.",
    min: 0,
    max: 500,
    step: 1,
    decimals: 1,
    minor: true,
  }).default(25),
  paperThickness: numberInput({
    label: "Paper thickness",
    unit: "mm",
    help: "Makes the wrap a touch longer, so that it meets. Office paper is about 0.1.",
    min: 0,
    max: 3,
    step: 0.05,
    decimals: 2,
    minor: true,
  }).default(0.1),
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
  samples: countInput({
    label: "Points round the tube",
    unit: "",
    help: "How many steps the listed curves have. It does not move the other numbers.",
    min: 8,
    max: 720,
    step: 4,
    minor: true,
  }).default(72),
});

export type TubePieceInputs = z.output<typeof tubePieceInputs>;
export type EndInputs = TubePieceInputs["ends"][number];
