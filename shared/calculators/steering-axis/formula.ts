import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { subtract, turn, unit, type Vector } from "../vectors.ts";
import type { SteeringAxisInputs } from "./inputs.ts";

/** The steering axis of one way up; mm and degrees. */
export interface SteeringAxisMeasures {
  /** Kingpin inclination; positive: the axis leans inboard at the top. */
  kpi: number;
  /** Positive: the axis leans rearward at the top. */
  caster: number;
  /** Positive: contact point outboard of the axis at the ground. */
  scrubRadius: number;
  /** Positive: contact point behind the axis at the ground. */
  trail: number;
  /** From the axis out to the wheel centre, at hub height. */
  spindleLength: number;
  /** Kingpin inclination and camber together. */
  includedAngle: number;
  /** Camber after steering by the key in degrees; positive steer swings the front of the wheel outboard. */
  camberAtSteer: Record<string, number>;
  /** Camber for 1 mm that the lower joint is moved out, the upper held. */
  camberPerMm: number;
  /** Travel of a joint's slot that gives a degree either way. */
  slotFor1deg: number;
  /** Height of the upper joint over the lower. */
  pivotSpread: number;
}

export interface SteeringAxisResults extends SteeringAxisMeasures {
  otherWayUp: SteeringAxisMeasures;
}

type Joint = SteeringAxisInputs["lower"];

/** The joints in use: as measured, or with the upright given half a turn about the spindle, which swaps them. */
export function jointsOf({ lower, upper, turnedOver }: SteeringAxisInputs): { lower: Joint; upper: Joint } {
  if (!turnedOver) return { lower, upper };
  return { lower: overturned(upper), upper: overturned(lower) };
}

const overturned = ({ out, up, fore }: Joint): Joint => ({ out, up: -up, fore: -fore });

const degrees = (radians: number) => (radians * 180) / Math.PI;
const radians = (angle: number) => (angle * Math.PI) / 180;

/** Wheel centre, contact point and where the axis cuts ground and hub height, for drawings; mm. */
export function axisPoints(inputs: SteeringAxisInputs) {
  const { lower, upper } = jointsOf(inputs);
  const lean = radians(inputs.camber);
  const wheelCentre: Joint = { out: -inputs.wheelOffset, up: 0, fore: 0 };
  const contact: Joint = {
    out: wheelCentre.out - inputs.loadedRadius * Math.sin(lean),
    up: -inputs.loadedRadius * Math.cos(lean),
    fore: 0,
  };
  const axisAt = (up: number): Joint => {
    const part = (up - lower.up) / (upper.up - lower.up);
    return {
      out: lower.out + part * (upper.out - lower.out),
      up,
      fore: lower.fore + part * (upper.fore - lower.fore),
    };
  };
  return { lower, upper, wheelCentre, contact, axisAtGround: axisAt(contact.up), axisAtHub: axisAt(0) };
}

/** Steered angles that are always listed, −30 to 30 by 5. */
export const steerAngles: readonly number[] = Array.from({ length: 13 }, (_, index) => 5 * index - 30);

/**
 * Camber of a wheel steered about its axis by an angle; all in degrees.
 *
 * The outward direction of the wheel's axis, (0, cos γ, −sin γ), is turned about the steering axis; camber is how
 * far it then points down.
 */
export function camberWhenSteered(camber: number, axis: Vector, steer: number): number {
  const spindle: Vector = [0, Math.cos(radians(camber)), -Math.sin(radians(camber))];
  const [, , up] = turn(spindle, axis, radians(steer));
  return -degrees(Math.asin(Math.min(1, Math.max(-1, up))));
}

function measures(inputs: SteeringAxisInputs): SteeringAxisMeasures {
  const { lower, upper, wheelCentre, contact, axisAtGround, axisAtHub } = axisPoints(inputs);
  const pivotSpread = upper.up - lower.up;
  const kpi = degrees(Math.atan2(lower.out - upper.out, pivotSpread));
  const axis = unit(subtract([upper.fore, upper.out, upper.up], [lower.fore, lower.out, lower.up]));
  const steered = steerAngles.map((steer) => [String(steer), camberWhenSteered(inputs.camber, axis, steer)]);
  return {
    kpi,
    caster: degrees(Math.atan2(lower.fore - upper.fore, pivotSpread)),
    scrubRadius: contact.out - axisAtGround.out,
    trail: axisAtGround.fore - contact.fore,
    spindleLength: wheelCentre.out - axisAtHub.out,
    includedAngle: kpi + inputs.camber,
    camberAtSteer: Object.fromEntries(steered),
    camberPerMm: -degrees(Math.atan(1 / pivotSpread)),
    slotFor1deg: 2 * pivotSpread * Math.tan(radians(1)),
    pivotSpread,
  };
}

/** The least height of the upper joint over the lower, mm: less than this is no upright. */
const LEAST_SPREAD = 20;

/**
 * Kingpin inclination, caster, scrub radius and trail of an upright measured on the bench, either way up.
 *
 * kpi = atan2(lower.out − upper.out, upper.up − lower.up), caster likewise with fore; contact point = wheel centre +
 * R·(−sin camber out, −cos camber up).
 *
 * @param inputs parsed by `steeringAxisInputs`
 * @returns fails on `upper.up` when the upper joint does not stand above the lower
 * @see ISO 8855:2011 for axes and terms; the signs are common practice
 */
export function steeringAxis(inputs: SteeringAxisInputs): Result<SteeringAxisResults, CalculatorIssue> {
  if (inputs.upper.up - inputs.lower.up < LEAST_SPREAD) {
    const message = `The upper joint must stand at least ${LEAST_SPREAD} mm above the lower one: set it at ${inputs.lower.up + LEAST_SPREAD} mm or more, or swap the joints.`;
    return fail({ field: "upper.up", message });
  }
  const otherWayUp = measures({ ...inputs, turnedOver: !inputs.turnedOver });
  return ok({ ...measures(inputs), otherWayUp });
}
