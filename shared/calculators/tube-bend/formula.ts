import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { TubeBendInputs } from "./inputs.ts";
import { bentPath, rotationsOf } from "./path.ts";

/** Results of `tube-bend`: the sheet a bender works from; mm, degrees, kg. */
export interface TubeBendResults {
  /** Straight lengths: before the first bend, between bends, after the last. */
  straights: number[];
  /** What the finished tube turns through at each bend. */
  bends: number[];
  /** What to bend it to, so that it springs back to that. */
  settings: number[];
  /** Turn of the tube before each bend, right-handed about the feed direction; first 0. */
  rotations: number[];
  /** Length of centreline in each bend. */
  arcs: number[];
  /** Length of the centreline. */
  developedLength: number;
  /** Where each bend begins and ends, from the cut end. */
  startMarks: number[];
  endMarks: number[];
  /** Developed length with the allowance at both ends. */
  cutLength: number;
  mass: number;
  /** Wall left on the outside of the tightest bend if the middle keeps its length. */
  outsideWall: number;
  notes: string[];
}

/**
 * A bender's sheet from the points of a tube's centreline.
 *
 * setback = R·tan(A/2); straight = distance between points − setbacks; arc = π/180·A·R; rotation = angle between the
 * planes of a bend and the last.
 *
 * @param inputs parsed by `tubeBendInputs`
 * @returns fails on `wall` for a tube without a bore, and as `bentPath` does
 */
export function tubeBend(inputs: TubeBendInputs): Result<TubeBendResults, CalculatorIssue> {
  const { od, wall, endAllowance, springback, density } = inputs;
  if (2 * wall >= od) {
    return fail({ field: "wall", message: `The wall must be less than half the diameter, ${od / 2} mm.` });
  }
  const path = bentPath(inputs);
  if (!path.ok) return path;
  const { bends, straights } = path.value;
  const angles = bends.map(({ angle }) => angle);
  const arcs = bends.map(({ angle, radius }) => (angle * Math.PI * radius) / 180);
  const startMarks: number[] = [];
  const endMarks: number[] = [];
  let from = endAllowance;
  for (const [index, arc] of arcs.entries()) {
    from += straights[index] ?? 0;
    startMarks.push(from);
    from += arc;
    endMarks.push(from);
  }
  const developedLength = from - endAllowance + (straights.at(-1) ?? 0);
  const cutLength = developedLength + 2 * endAllowance;
  const tightest = Math.min(...bends.map(({ radius }) => radius));
  return ok({
    straights,
    bends: angles,
    settings: angles.map((angle) => angle * (1 + springback / 90)),
    rotations: rotationsOf(path.value),
    arcs,
    developedLength,
    startMarks,
    endMarks,
    cutLength,
    mass: Math.PI * (od - wall) * wall * cutLength * density * 1e-9,
    outsideWall: (wall * tightest) / (tightest + od / 2),
    notes: notesOn(tightest, od),
  });
}

function notesOn(tightest: number, od: number): string[] {
  if (tightest >= 2 * od) return [];
  return [
    `A radius of ${tightest} mm is less than twice the diameter (${2 * od} mm): without a mandrel and the right die the tube will flatten, wrinkle or crack.`,
  ];
}
