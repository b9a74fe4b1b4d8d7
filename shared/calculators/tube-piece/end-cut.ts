import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { mitreFromAxis } from "../mitre/formula.ts";
import { checkJoint, distanceFromAxis, joint, lowest } from "../saddle-cope/formula.ts";
import type { EndInputs, TubePieceInputs } from "./inputs.ts";

/** One end's cut, told from its own joint and in its own places round the tube (0 at its heel). Lengths in mm. */
export interface EndCut {
  /** Distance along the tube from the joint's axis to the cut, on the cylinder of this radius. */
  fromAxis(radius: number, around: number): number;
  /** From the joint's axis to the longest point of the tube. */
  tip: number;
  deepest: number;
}

/** Steps of the walk round the tube; the search between them is fine. */
export const WALK = 180;

/**
 * The cut of one end.
 *
 * @param index 0 for A, 1 for B; errors name the field under `ends.0` or `ends.1`
 * @returns fails on a number that the kind of end needs and lacks, and as the saddle cope does
 */
export function endCut(
  piece: TubePieceInputs,
  end: EndInputs,
  index: number,
): Result<EndCut, CalculatorIssue> {
  const at = (name: string) => `ends.${index}.${name}`;
  if (end.kind === "square") {
    return ok({ fromAxis: () => end.setback, tip: end.setback, deepest: 0 });
  }
  if (end.kind === "mitre") {
    const { turn } = end;
    if (turn === undefined) return fail({ field: at("turn"), message: "A mitre needs its turn in °." });
    return ok(measured(piece, (radius, around) => mitreFromAxis(turn, radius, around)));
  }
  const { headerOd, angle, offset } = end;
  if (headerOd === undefined) {
    return fail({ field: at("headerOd"), message: "A saddle needs the header's outside diameter in mm." });
  }
  if (angle === undefined) {
    return fail({ field: at("angle"), message: "A saddle needs the angle between the axes in °." });
  }
  const saddle = { ...piece, headerOd, angle, offset };
  const issue = checkJoint(saddle);
  if (issue) return fail(issue.field === "offset" ? { ...issue, field: at("offset") } : issue);
  const tube = joint(saddle);
  return ok(measured(piece, (radius, around) => distanceFromAxis(tube, radius, around)));
}

function measured({ branchOd }: TubePieceInputs, fromAxis: EndCut["fromAxis"]): EndCut {
  const outside = branchOd / 2;
  const tip = lowest((around) => fromAxis(outside, around), WALK).value;
  const longest = -lowest((around) => -fromAxis(outside, around), WALK).value;
  return { fromAxis, tip, deepest: longest - tip };
}
