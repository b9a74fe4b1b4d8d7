import type { SheetBendResults } from "#shared/calculators/sheet-bend/formula.ts";
import type { SheetBendInputs } from "#shared/calculators/sheet-bend/inputs.ts";
import type { Spot } from "./drawing-parts.tsx";

/** A place on the sheet's side with the unit vector away from it; mm, y upward. */
export interface SheetPlace {
  middle: Spot;
  out: Spot;
}

export interface SheetProfile {
  /** Once round the edge of the bent sheet. */
  outline: Spot[];
  /** Across the sheet where each bend begins and ends. */
  tangents: [Spot, Spot][];
  /** On the outer side of each flange's flat part. */
  flanges: SheetPlace[];
  /** On the inner side of each bend. */
  bends: SheetPlace[];
}

interface Walker {
  /** On the left face, seen along the walk. */
  place: Spot;
  heading: number;
}

/**
 * The edge of the bent sheet: the first flange runs to the right, and positive bends turn counter-clockwise.
 *
 * @param results flats of the same inputs
 */
export function sheetProfile(inputs: SheetBendInputs, results: SheetBendResults): SheetProfile {
  const { angles, thickness, insideRadius } = inputs;
  const left: Spot[] = [];
  const right: Spot[] = [];
  const tangents: [Spot, Spot][] = [];
  const flanges: SheetPlace[] = [];
  const bends: SheetPlace[] = [];
  let walker: Walker = { place: [0, 0], heading: 0 };
  const across = ({ place: [x, y], heading }: Walker): Spot => [
    x + thickness * Math.sin(heading),
    y - thickness * Math.cos(heading),
  ];
  const note = () => {
    left.push(walker.place);
    right.push(across(walker));
  };
  for (const [index, flat] of results.flats.entries()) {
    note();
    const start = walker;
    walker = ahead(walker, flat);
    note();
    // The outer side is away from the bend that the flange comes from, or goes to.
    const turn = Math.sign(angles[index] ?? angles[index - 1] ?? 1);
    const half = ahead(start, flat / 2);
    flanges.push({ middle: turn > 0 ? across(half) : half.place, out: normal(half.heading, -turn) });
    const angle = angles[index];
    if (angle === undefined) break;
    tangents.push([walker.place, across(walker)]);
    const radius = angle > 0 ? insideRadius : insideRadius + thickness;
    const before = walker;
    const steps = Math.ceil(Math.abs(angle) / 5);
    for (let step = 1; step <= steps; step += 1) {
      walker = turned(before, radius, (angle * step * Math.PI) / (180 * steps));
      note();
    }
    const middle = turned(before, radius, (angle * Math.PI) / 360);
    const inner = angle > 0 ? middle.place : across(middle);
    bends.push({ middle: inner, out: normal(middle.heading, Math.sign(angle)) });
    tangents.push([walker.place, across(walker)]);
  }
  return { outline: [...left, ...right.toReversed()], tangents, flanges, bends };
}

function ahead({ place: [x, y], heading }: Walker, distance: number): Walker {
  return { place: [x + distance * Math.cos(heading), y + distance * Math.sin(heading)], heading };
}

/** Round a centre to the left by a positive angle in radians, to the right by a negative one. */
function turned({ place: [x, y], heading }: Walker, radius: number, angle: number): Walker {
  const way = Math.sign(angle);
  const [cx, cy] = [x - way * radius * Math.sin(heading), y + way * radius * Math.cos(heading)];
  const next = heading + angle;
  return { place: [cx + way * radius * Math.sin(next), cy - way * radius * Math.cos(next)], heading: next };
}

/** Unit vector to the left (1) or right (−1) of a heading. */
function normal(heading: number, way: number): Spot {
  return [-way * Math.sin(heading), way * Math.cos(heading)];
}
