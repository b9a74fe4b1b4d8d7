import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { lowest } from "../saddle-cope/formula.ts";
import { type EndCut, endCut, WALK } from "./end-cut.ts";
import type { TubePieceInputs } from "./inputs.ts";

/** Both cuts at one place of the strip; mm along it from A's tip. */
export interface StripPoint {
  /** Degrees round the tube from A's heel, counter-clockwise looking from A to B. */
  around: number;
  a: number;
  innerA: number;
  b: number;
  innerB: number;
}

/** One end by itself; mm. */
export interface PieceEnd {
  /** From the joint's axis to the longest point of the tube, along the tube. */
  tipFromAxis: number;
  deepest: number;
}

/** Results of `tube-piece`; mm, degrees, kg. */
export interface TubePieceResults {
  tipToTip: number;
  /** Length of the shortest line along the outside. */
  shortest: number;
  roughCut: number;
  /** Cut this end first: a mistake there costs only the allowance. */
  hardEnd: "A" | "B" | "either";
  ends: [PieceEnd, PieceEnd];
  /** The whole tube unrolled, print outward, A's end up; its datum line is A's heel, and B's heel lies at `heelB`. */
  strip: { width: number; length: number; heelB: number; curve: StripPoint[] };
  /** Of the finished piece. */
  mass: number;
}

/**
 * One tube between two joints.
 *
 * Places are told from A's heel. B's own places run the other way round, for they are told looking at B's end:
 * φB = clock − φ. A line of the tube is between − sA(φ) − sB(clock − φ) long.
 *
 * @param inputs parsed by `tubePieceInputs`
 * @returns fails as the cuts of its ends do, on `branchWall` when it leaves no bore, and on `between` when the cuts
 * run into each other
 * @see `distanceFromAxis` of saddle-cope and `mitreFromAxis`; compared with a solid kernel in tests/reference
 */
export function tubePiece(inputs: TubePieceInputs): Result<TubePieceResults, CalculatorIssue> {
  const { branchOd, branchWall, between, ends } = inputs;
  if (branchWall >= branchOd / 2) {
    const message = `The wall leaves no bore: it must be less than half the outside diameter (${Number((branchOd / 2).toFixed(3))} mm).`;
    return fail({ field: "branchWall", message });
  }
  const [endA, endB] = ends;
  if (!endA || !endB) return fail({ field: "ends", message: "A piece has two ends: give A, then B." });
  const a = endCut(inputs, endA, 0);
  if (!a.ok) return a;
  const b = endCut(inputs, endB, 1);
  if (!b.ok) return b;
  const lengthAt = (radius: number, around: number) =>
    between - a.value.fromAxis(radius, around) - b.value.fromAxis(radius, inputs.clock - around);
  const shortest = lowest((around) => lengthAt(branchOd / 2, around), WALK).value;
  const least = Math.min(
    shortest,
    lowest((around) => lengthAt(branchOd / 2 - branchWall, around), WALK).value,
  );
  if (least <= 0) return fail({ field: "between", message: cutsMeet(between, least) });
  const tipToTip = between - a.value.tip - b.value.tip;
  return ok({
    tipToTip,
    shortest,
    roughCut: tipToTip + inputs.allowance,
    hardEnd: harder(a.value.deepest, b.value.deepest),
    ends: [summary(a.value), summary(b.value)],
    strip: strip(inputs, a.value, b.value, tipToTip),
    mass: metal(inputs, lengthAt) * inputs.density * 1e-9,
  });
}

const summary = ({ tip, deepest }: EndCut): PieceEnd => ({ tipFromAxis: tip, deepest });

function harder(a: number, b: number): TubePieceResults["hardEnd"] {
  if (Math.abs(a - b) < 1e-6) return "either";
  return a > b ? "A" : "B";
}

function cutsMeet(between: number, least: number): string {
  const needed = Math.ceil((between - least) * 10) / 10;
  return `The two cuts run into each other: make the distance between more than ${needed} mm.`;
}

function strip(inputs: TubePieceInputs, a: EndCut, b: EndCut, length: number): TubePieceResults["strip"] {
  const { branchOd, branchWall, clock, samples } = inputs;
  const [outside, bore] = [branchOd / 2, branchOd / 2 - branchWall];
  const curve = Array.from({ length: samples + 1 }, (_, step): StripPoint => {
    const around = (360 * step) / samples;
    return {
      around,
      a: a.fromAxis(outside, around) - a.tip,
      innerA: a.fromAxis(bore, around) - a.tip,
      b: length - (b.fromAxis(outside, clock - around) - b.tip),
      innerB: length - (b.fromAxis(bore, clock - around) - b.tip),
    };
  });
  const width = Math.PI * (branchOd + inputs.paperThickness);
  const heelB = (width * (((clock % 360) + 360) % 360)) / 360;
  return { width, length, heelB, curve };
}

/** Volume of metal in mm³: Simpson's rule through the wall, even steps round it. */
function metal(
  { branchOd, branchWall }: TubePieceInputs,
  lengthAt: (radius: number, around: number) => number,
) {
  const ring = (radius: number) => {
    let sum = 0;
    for (let around = 0; around < 360; around += 4) sum += lengthAt(radius, around);
    return (sum / 90) * 2 * Math.PI * radius;
  };
  const outside = branchOd / 2;
  const bore = outside - branchWall;
  return (branchWall / 6) * (ring(bore) + 4 * ring((bore + outside) / 2) + ring(outside));
}
