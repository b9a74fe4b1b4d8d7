import { defineCalculator, type ResultField } from "../definition.ts";
import { steeringAxis as compute } from "./formula.ts";
import { steeringAxisInputs } from "./inputs.ts";

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

const measures: readonly ResultField[] = [
  field("kpi", "Kingpin inclination", "°", 2, "Positive: the axis leans inboard at the top."),
  field("caster", "Caster", "°", 2, "Positive: the axis leans rearward at the top."),
  field("scrubRadius", "Scrub radius", "mm", 1, "Positive: the contact point lies outboard of the axis."),
  field("trail", "Trail", "mm", 1, "Positive: the contact point lies behind the axis."),
  field("spindleLength", "Spindle length", "mm", 1, "From the axis out to the wheel centre, at hub height."),
  field("includedAngle", "Included angle", "°", 2, "Kingpin inclination and camber together."),
  field("camberAtSteer.-20", "Camber, 20° steered in", "°", 2, "Front of the wheel swung inboard by 20°."),
  field("camberAtSteer.-10", "Camber, 10° steered in", "°", 2, "Front of the wheel swung inboard by 10°."),
  field("camberAtSteer.10", "Camber, 10° steered out", "°", 2, "Front of the wheel swung outboard by 10°."),
  field("camberAtSteer.20", "Camber, 20° steered out", "°", 2, "Front of the wheel swung outboard by 20°."),
  field("camberPerMm", "Camber per mm", "°", 3, "For each mm the lower joint is moved out, the upper held."),
  field("slotFor1deg", "Slot for a degree either way", "mm", 1, "Travel of the joint in its slot."),
];

/** Kingpin inclination, caster, scrub radius and trail of an upright measured on the bench. */
export const steeringAxisCalculator = defineCalculator({
  id: "steering-axis",
  version: 1,
  name: "Steering axis",
  purpose:
    "Find kingpin inclination, caster, scrub radius and trail of an upright measured on the bench, either way up.",
  group: "Corner and steering",
  words: [
    "kingpin",
    "KPI",
    "SAI",
    "swivel axis",
    "upright",
    "hub carrier",
    "caster",
    "castor",
    "scrub radius",
    "trail",
    "steered camber",
  ],
  inputs: steeringAxisInputs,
  example: {
    lower: { out: -62, up: -96, fore: 6 },
    upper: { out: -92, up: 148, fore: -14 },
    wheelOffset: 25,
    loadedRadius: 268,
    camber: -1,
  },
  compute,
  resultFields: [
    ...measures,
    ...measures.map((each) => ({ ...each, name: `otherWayUp.${each.name}`, section: "The other way up" })),
  ],
  cautions: [
    "This is a sum, not an approval. Steering carries everyone in the car and near it: have an engineer judge the design and an inspector the car.",
    "An upright turned over carries its brake, its arm and its loads the wrong way round. That it comes out well here does not say that it may be used so.",
    "Measure to the centre of the joints, not to their faces, and measure twice: a millimetre is a quarter of a degree on a short upright.",
    "A slot must be locked positively. Friction alone does not hold a steering or suspension joint.",
  ],
  method: {
    formula: [
      "kpi = atan2(lower out − upper out, upper up − lower up)",
      "caster = atan2(lower fore − upper fore, upper up − lower up)",
      "wheel centre C = (out −ET, up 0, fore 0),  contact = C + R·(−sin γ out, −cos γ up)",
      "scrub radius = contact out − axis out at the ground,  trail = axis fore at the ground − contact fore",
      "spindle length = C out − axis out at hub height,  included angle = kpi + γ",
      "steered camber: n = (0 fore, cos γ out, −sin γ up) turned about the axis; camber = −asin(n up)",
      "camber per mm = −atan(1 / spread),  slot for 1° = 2·spread·tan 1°,  spread = upper up − lower up",
    ],
    explanation:
      "γ is the camber, R the loaded radius, ET the wheel offset. Turned over means half a turn about the spindle: fore and up change sign and the joints swap places. A left wheel is meant; a right one is its mirror image.",
    sources: [
      "ISO 8855:2011 for axes and terms.",
      "Signs of kingpin inclination, caster, scrub radius and trail: common practice.",
    ],
  },
});
