import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { along, angleBetween, cross, distance, dot, subtract, unit, type Vector } from "../vectors.ts";
import type { TubeBendInputs } from "./inputs.ts";

/** One bend of the centreline; mm, angles in degrees. */
export interface PathBend {
  /** Where the two straights would meet. */
  corner: Vector;
  radius: number;
  /** What the tube turns through. */
  angle: number;
  /** Unit direction about which it turns, right-handed. */
  normal: Vector;
  /** From the corner back to where the bend begins, along the straight. */
  setback: number;
  start: Vector;
  end: Vector;
  /** Middle of the bend's arc. */
  centre: Vector;
}

/** The centreline as straights and arcs, for the sums and for drawings. */
export interface BentPath {
  /** Unit direction of each straight. */
  headings: Vector[];
  bends: PathBend[];
  /** Length left of each straight between its bends, mm. */
  straights: number[];
}

const fault = (field: string, message: string) => fail({ field, message });

/**
 * The centreline through the points with its corners rounded off.
 *
 * @returns fails on `points.n` for points in one place, in line, or turning straight back, and on `bendRadius` for a
 * number of radii that does not fit, a radius under half the diameter, and bends that overlap
 */
export function bentPath(inputs: TubeBendInputs): Result<BentPath, CalculatorIssue> {
  const { points, od } = inputs;
  const radii = radiiOf(inputs);
  if (!radii.ok) return radii;
  const legs = points.slice(1).map((point, index) => subtract(point, points[index] ?? point));
  const lengths = points.slice(1).map((point, index) => distance(point, points[index] ?? point));
  const still = lengths.findIndex((length) => length < 0.1);
  if (still >= 0) {
    return fault(
      `points.${still + 1}`,
      `Points ${still + 1} and ${still + 2} are in one place: move them at least 0.1 mm apart.`,
    );
  }
  const headings = legs.map(unit);
  const bends: PathBend[] = [];
  for (const [index, radius] of radii.value.entries()) {
    const bend = bendAt(index, points[index + 1] ?? [0, 0, 0], headings, radius);
    if (!bend.ok) return bend;
    bends.push(bend.value);
  }
  const tight = radii.value.find((radius) => radius < od / 2);
  if (tight !== undefined) {
    return fault(
      "bendRadius",
      `A bend radius of ${tight} mm is tighter than the tube itself: it must be at least half the diameter, ${od / 2} mm.`,
    );
  }
  const straights = lengths.map(
    (length, index) => length - (bends[index - 1]?.setback ?? 0) - (bends[index]?.setback ?? 0),
  );
  const short = straights.findIndex((straight) => straight < -1e-9);
  if (short >= 0)
    return fault("bendRadius", overlap(short, lengths[short] ?? 0, -(straights[short] ?? 0), bends));
  return ok({ headings, bends, straights: straights.map((straight) => Math.max(0, straight)) });
}

function radiiOf({ points, bendRadius }: TubeBendInputs): Result<number[], CalculatorIssue> {
  const count = points.length - 2;
  if (typeof bendRadius === "number") return ok(new Array(count).fill(bendRadius));
  const [only] = bendRadius;
  if (bendRadius.length === 1 && only !== undefined) return ok(new Array(count).fill(only));
  if (bendRadius.length === count) return ok(bendRadius);
  return fault(
    "bendRadius",
    `${points.length} points make ${count} bends, but ${bendRadius.length} radii were given: give 1 for all, or ${count}.`,
  );
}

function bendAt(
  index: number,
  corner: Vector,
  headings: readonly Vector[],
  radius: number,
): Result<PathBend, CalculatorIssue> {
  const into = headings[index] ?? [1, 0, 0];
  const onward = headings[index + 1] ?? into;
  const turned = angleBetween(into, onward);
  const angle = (turned * 180) / Math.PI;
  const name = `points.${index + 1}`;
  const three = `Points ${index + 1}, ${index + 2} and ${index + 3}`;
  if (angle < 0.05) return fault(name, `${three} are in line: leave the middle one out, or move it aside.`);
  if (angle > 175) {
    return fault(
      name,
      `${three} turn straight back: a bend turns through 175° at most. Split it with one more point.`,
    );
  }
  const normal = unit(cross(into, onward));
  const setback = radius * Math.tan(turned / 2);
  const start = along(corner, into, -setback);
  const end = along(corner, onward, setback);
  return ok({
    corner,
    radius,
    angle,
    normal,
    setback,
    start,
    end,
    centre: along(start, cross(normal, into), radius),
  });
}

function overlap(leg: number, length: number, missing: number, bends: readonly PathBend[]): string {
  const before = bends[leg - 1];
  const after = bends[leg];
  const room =
    length / [before, after].reduce((sum, bend) => sum + (bend ? bend.setback / bend.radius : 0), 0);
  const most = Math.floor(room * 10) / 10;
  const what =
    before && after
      ? `Bends ${leg} and ${leg + 1} overlap`
      : `Bend ${before ? leg : leg + 1} runs past the end of the tube`;
  return `${what}: points ${leg + 1} and ${leg + 2} are ${missing.toFixed(1)} mm too close. Keep the radius there at ${most} mm or less, or move the points apart.`;
}

/**
 * Turn of the tube before each bend, degrees, right-handed about the direction the centreline runs; first 0.
 *
 * It is the angle from the last bend's normal to this one's, −180 < rotation ≤ 180.
 */
export function rotationsOf({ headings, bends }: BentPath): number[] {
  return bends.map(({ normal }, index) => {
    const last = bends[index - 1];
    const heading = headings[index];
    if (!last || !heading) return 0;
    const sine = dot(cross(last.normal, normal), heading);
    const angle = (Math.atan2(sine, dot(last.normal, normal)) * 180) / Math.PI;
    return angle < -180 + 1e-9 ? 180 : angle;
  });
}

/** A point of a bend's arc, `part` of the way through it (0 to 1); for drawings. */
export function onArc({ centre, start, normal, angle }: PathBend, part: number): Vector {
  const spoke = subtract(start, centre);
  const turned = (part * angle * Math.PI) / 180;
  return along(along(centre, spoke, Math.cos(turned)), cross(normal, spoke), Math.sin(turned));
}
