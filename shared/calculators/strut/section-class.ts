import type { SectionShape } from "../tube-section/shape.ts";

/** How thin the wall is against the class limits of EN 1993-1-1, table 5.2, for a tube in even compression. */
export interface WallSlenderness {
  /** 1 to 3; 4 buckles locally before it yields. */
  sectionClass: 1 | 2 | 3 | 4;
  /** "d/t" of a round tube, "c/t" of the widest flat of a box, with its class 3 limit. */
  name: "d/t" | "c/t";
  ratio: number;
  limit: number;
  /** The thinnest wall that stays within class 3, mm. */
  thinnest: number;
}

/**
 * Class of a tube in compression.
 *
 * Round: d/t up to 50ε², 70ε², 90ε². Flat of a box: c/t up to 33ε, 38ε, 42ε, with c = side − 3t, or side − 2t with
 * sharp corners. ε = √(235 / yield).
 *
 * @param yieldStrength MPa
 * @see EN 1993-1-1:2005, table 5.2, sheets 1 and 3
 */
export function wallSlenderness(shape: SectionShape, yieldStrength: number): WallSlenderness {
  const epsilon = Math.sqrt(235 / yieldStrength);
  if (shape.kind === "round") {
    const limits = [50, 70, 90].map((limit) => limit * epsilon ** 2);
    const [, , limit = 0] = limits;
    const ratio = shape.od / shape.wall;
    return { name: "d/t", ratio, limit, sectionClass: classOf(ratio, limits), thinnest: shape.od / limit };
  }
  const walls = shape.outsideRadius === 0 ? 2 : 3;
  const widest = Math.max(shape.width, shape.height);
  const limits = [33, 38, 42].map((limit) => limit * epsilon);
  const [, , limit = 0] = limits;
  const ratio = widest / shape.wall - walls;
  return {
    name: "c/t",
    ratio,
    limit,
    sectionClass: classOf(ratio, limits),
    thinnest: widest / (limit + walls),
  };
}

function classOf(ratio: number, [one = 0, two = 0, three = 0]: readonly number[]): 1 | 2 | 3 | 4 {
  if (ratio <= one) return 1;
  if (ratio <= two) return 2;
  return ratio <= three + 1e-9 ? 3 : 4;
}
