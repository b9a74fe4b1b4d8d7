import { defineCalculator, type ResultField } from "../definition.ts";
import { cornerWeights as compute } from "./formula.ts";
import { cornerWeightsInputs } from "./inputs.ts";

const field = (
  name: string,
  label: string,
  unit: string,
  decimals: number,
  meaning: string,
): ResultField => ({
  name,
  label,
  unit,
  decimals,
  meaning,
});

/** Balance of a car on four scales, and where its centre of gravity is. */
export const cornerWeightsCalculator = defineCalculator({
  id: "corner-weights",
  version: 1,
  name: "Corner weights",
  purpose: "Find the balance of a car on four scales, and where its centre of gravity is.",
  group: "Corner and steering",
  words: [
    "scales",
    "corner scales",
    "cross weight",
    "wedge",
    "weight distribution",
    "centre of gravity",
    "CG height",
    "balance",
  ],
  inputs: cornerWeightsInputs,
  example: {
    lf: 118,
    rf: 112,
    lr: 149,
    rr: 141,
    wheelbase: 2300,
    frontTrack: 1290,
    rearTrack: 1270,
    lifted: { height: 400, frontMass: 236, loadedRadius: 268 },
  },
  compute,
  resultFields: [
    field("total", "Total", "kg", 1, "All four scales."),
    field("frontPercent", "Front", "%", 1, "Share of the front wheels."),
    field("leftPercent", "Left", "%", 1, "Share of the left wheels."),
    field("crossPercent", "Cross", "%", 1, "Share of right front and left rear. 50 is even."),
    field("crossDifference", "Diagonals differ by", "kg", 1, "Right front and left rear less the other two."),
    field("cgFromFront", "Centre of gravity from front axle", "mm", 0, "Behind the front wheel centres."),
    field("cgFromCentre", "Centre of gravity off centre", "mm", 1, "Positive: to the left."),
    field("cgHeight", "Height of centre of gravity", "mm", 0, "Above the ground, from the second weighing."),
    field(
      "massMoved",
      "Moved to the front",
      "kg",
      1,
      "Front scales with the rear raised, less those on the level.",
    ),
  ],
  cautions: [
    "This is a sum, not an approval of the car.",
    "A raised car rolls and falls. Chock the front wheels both ways, leave the brakes off only as far as the weighing needs, and let nobody under it or in it.",
    "Lock the suspension solid and fill the tanks before you raise the rear: springs that move or fuel that runs forward spoil the height.",
    "The height comes from a small difference of large readings. Raise it as far as you can hold it, and weigh twice: one kilogram can be 20 mm.",
  ],
  method: {
    formula: [
      "front % = (lf + rf) / total,  left % = (lf + lr) / total,  cross % = (rf + lr) / total",
      "from front axle = wheelbase·(lr + rr) / total",
      "off centre = ((lf − rf)·front track + (lr − rr)·rear track) / (2·total)",
      "height = loaded radius + wheelbase·Δm / (total·tan θ),  sin θ = raised / wheelbase",
    ],
    explanation:
      "Moments of the four readings about the front axle and the centreline give the place in plan. With the rear raised the car stands at the angle θ, and Δm moves to the front because the centre of gravity lies above the wheel centres.",
    sources: [
      "Balance of moments.",
      "Cross weight as right front and left rear, even at 50 %: common practice, no source.",
    ],
  },
});
