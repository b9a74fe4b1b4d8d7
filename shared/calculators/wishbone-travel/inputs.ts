import { z } from "zod";
import { choiceInput, numberInput, pointInput } from "../inputs.ts";

const axes = ["fore", "out", "up"] as const;

const point = (label: string, help: string) =>
  pointInput({ label, help, axes, min: -3000, max: 3000, step: 1 });

const direction = (label: string) =>
  pointInput({
    label,
    help: "Direction of the housing's bore at rest: any length counts. Left out: square to the arm.",
    axes,
    unit: "",
    min: -1000,
    max: 1000,
    step: 0.05,
  });

const springInputs = z.strictObject(
  {
    chassis: point("Spring on the chassis", "The end that stays with the car."),
    moving: point("Spring on the moving part", "The other end, at rest."),
    on: choiceInput({
      label: "Spring stands on",
      help: "The part that carries the moving end.",
      choices: [
        { value: "lower", label: "Lower arm" },
        { value: "upper", label: "Upper arm" },
        { value: "upright", label: "Upright" },
      ],
    }),
  },
  { error: "Give the spring as chassis, moving and on, or leave it out." },
);

/**
 * Inputs of `wishbone-travel`: mm and degrees. Points are [fore, out, up] of a left wheel, from the centreline at
 * ground level, with the car at rest: the x, y, z of ISO 8855.
 */
export const wishboneTravelInputs = z.strictObject({
  lowerFront: point("Lower arm, front pivot", "On the chassis."),
  lowerRear: point("Lower arm, rear pivot", "On the chassis."),
  lowerJoint: point("Lower joint", "Centre of the ball or bearing at the upright."),
  upperFront: point("Upper arm, front pivot", "On the chassis."),
  upperRear: point("Upper arm, rear pivot", "On the chassis."),
  upperJoint: point("Upper joint", "Centre of the ball or bearing at the upright."),
  rodInner: point("Rod, inner end", "On the rack or the chassis, wheels straight ahead."),
  rodOuter: point("Rod, outer end", "On the upright's arm."),
  wheelCentre: point("Wheel centre", "Centre of the rim, on the wheel's axis."),
  camber: numberInput({
    label: "Camber",
    unit: "°",
    help: "At rest. Positive: the top of the wheel leans out.",
    min: -15,
    max: 15,
    step: 0.1,
    decimals: 2,
  }).default(0),
  toe: numberInput({
    label: "Toe",
    unit: "°",
    help: "At rest, this wheel alone. Positive: toe-in.",
    min: -10,
    max: 10,
    step: 0.05,
    decimals: 2,
  }).default(0),
  loadedRadius: numberInput({
    label: "Loaded radius",
    unit: "mm",
    help: "From the wheel centre to the ground, car standing.",
    min: 50,
    max: 1000,
    step: 1,
    decimals: 1,
  }),
  bump: numberInput({
    label: "Bump",
    unit: "mm",
    help: "How far up the wheel centre goes.",
    min: 0,
    max: 400,
    step: 1,
    decimals: 1,
  }),
  rebound: numberInput({
    label: "Rebound",
    unit: "mm",
    help: "How far down it goes, as a positive number.",
    min: 0,
    max: 400,
    step: 1,
    decimals: 1,
  }),
  step: numberInput({
    label: "Step",
    unit: "mm",
    help: "Travel from one row to the next.",
    min: 1,
    max: 100,
    step: 1,
    decimals: 1,
    minor: true,
  }).default(5),
  spring: springInputs.meta({ label: "Spring", help: "Leave out to see the wheel alone." }).optional(),
  lowerHousingAxis: direction("Lower housing axis").optional(),
  upperHousingAxis: direction("Upper housing axis").optional(),
  jointSwing: numberInput({
    label: "Joint swing",
    unit: "°",
    help: "What the maker rates the joints for, to one side.",
    min: 1,
    max: 60,
    step: 0.5,
    decimals: 1,
  }).optional(),
  tableUp: numberInput({
    label: "Jig table",
    unit: "mm",
    help: "Height of its top above the drawing's ground level. Left out: at ground level.",
    min: -2000,
    max: 2000,
    step: 1,
    decimals: 1,
  }).optional(),
});

export type WishboneTravelInputs = z.output<typeof wishboneTravelInputs>;
