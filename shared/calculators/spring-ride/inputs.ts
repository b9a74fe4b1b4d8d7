import { z } from "zod";
import { numberInput } from "../inputs.ts";

const coilInputs = z
  .strictObject(
    {
      wire: numberInput({
        label: "Wire",
        unit: "mm",
        help: "Diameter of the wire.",
        min: 0.5,
        max: 60,
        step: 0.1,
        decimals: 2,
      }),
      meanDiameter: numberInput({
        label: "Mean diameter",
        unit: "mm",
        help: "Of the coil, middle of wire to middle of wire: outside diameter less one wire.",
        min: 2,
        max: 600,
        step: 0.5,
        decimals: 1,
      }),
      activeCoils: numberInput({
        label: "Active coils",
        unit: "",
        help: "Those free to twist. A closed, ground end takes away about one.",
        min: 1,
        max: 100,
        step: 0.25,
        decimals: 2,
      }),
      shearModulus: numberInput({
        label: "Shear modulus",
        unit: "MPa",
        help: "About 79300 for spring steel; standards for drawn wire give 81500.",
        min: 20_000,
        max: 100_000,
        step: 100,
        decimals: 0,
      }).default(79_300),
    },
    { error: "Give the coil as wire, meanDiameter and activeCoils, or leave it out." },
  )
  .meta({ label: "Coil", help: "To find the rate of a spring you can measure." });

/** Inputs of `spring-ride`: one corner; kg, N/mm, Hz. */
export const springRideInputs = z.strictObject({
  cornerMass: numberInput({
    label: "Corner mass",
    unit: "kg",
    help: "Sprung: what the corner scale shows, less wheel, brake, upright and half of the arms.",
    min: 1,
    max: 10_000,
    step: 1,
    decimals: 1,
  }),
  springRate: numberInput({
    label: "Spring rate",
    unit: "N/mm",
    help: "Of the spring itself. 1 lb/in is 0.175 N/mm.",
    min: 0.1,
    max: 5000,
    step: 0.5,
    decimals: 2,
  }),
  motionRatio: numberInput({
    label: "Motion ratio",
    unit: "",
    help: "Spring travel for each mm of wheel travel.",
    min: 0.05,
    max: 2,
    step: 0.01,
    decimals: 3,
  }),
  tyreRate: numberInput({
    label: "Tyre rate",
    unit: "N/mm",
    help: "Upright stiffness of the tyre at its pressure. 150 to 250 is usual for a car: common practice, no source.",
    min: 1,
    max: 10_000,
    step: 5,
    decimals: 1,
  }),
  targetFrequency: numberInput({
    label: "Target frequency",
    unit: "Hz",
    help: "Ride frequency you would like. Road cars 1 to 1.5, sporting ones 1.5 to 2.5: common practice, no source.",
    min: 0.2,
    max: 10,
    step: 0.05,
    decimals: 2,
  }).optional(),
  coil: coilInputs.optional(),
});

export type SpringRideInputs = z.output<typeof springRideInputs>;
