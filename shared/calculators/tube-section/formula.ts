import { ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { TubeSectionInputs } from "./inputs.ts";
import { type SectionShape, sectionShape } from "./shape.ts";

/**
 * What a section's shape gives, in mm to the needed power. The strong axis first; a round or square tube has the same
 * about both.
 */
export interface SectionProperties {
  area: number;
  /** Second moment of area about the strong axis, and about the weak one. */
  i: number;
  iMinor: number;
  /** Elastic section modulus. */
  w: number;
  wMinor: number;
  /** Plastic section modulus. */
  wpl: number;
  wplMinor: number;
  radiusOfGyration: number;
  radiusOfGyrationMinor: number;
  /** Torsional inertia constant It. */
  torsion: number;
  /** Torsional modulus constant Ct. */
  torsionModulus: number;
  /** Corner radii; 0 for a round tube and for sharp corners. */
  outsideRadius: number;
  insideRadius: number;
  /** Outside line once round, mm. */
  perimeter: number;
}

/** Results of `tube-section`; mm, with mass in kg/m and paintable surface in m²/m. */
export interface TubeSectionResults extends SectionProperties {
  massPerMetre: number;
  surfacePerMetre: number;
}

/**
 * Section properties, mass and surface of a tube.
 *
 * @param inputs parsed by `tubeSectionInputs`
 * @returns fails as `sectionShape` does
 * @see EN 10219-2:2006, annex B; EN 10210-2:2006, annex A
 */
export function tubeSection(inputs: TubeSectionInputs): Result<TubeSectionResults, CalculatorIssue> {
  const shape = sectionShape(inputs);
  if (!shape.ok) return shape;
  const properties = sectionProperties(shape.value);
  return ok({
    ...properties,
    massPerMetre: properties.area * inputs.density * 1e-6,
    surfacePerMetre: properties.perimeter / 1000,
  });
}

/** Properties of a section that `sectionShape` has let through. */
export function sectionProperties(shape: SectionShape): SectionProperties {
  return shape.kind === "round" ? round(shape) : box(shape);
}

function round({ od, wall }: Extract<SectionShape, { kind: "round" }>): SectionProperties {
  const bore = od - 2 * wall;
  const area = (Math.PI / 4) * (od ** 2 - bore ** 2);
  const i = (Math.PI / 64) * (od ** 4 - bore ** 4);
  const w = (2 * i) / od;
  const wpl = (od ** 3 - bore ** 3) / 6;
  const radiusOfGyration = Math.sqrt(i / area);
  return {
    area,
    i,
    iMinor: i,
    w,
    wMinor: w,
    wpl,
    wplMinor: wpl,
    radiusOfGyration,
    radiusOfGyrationMinor: radiusOfGyration,
    torsion: 2 * i,
    torsionModulus: 2 * w,
    outsideRadius: 0,
    insideRadius: 0,
    perimeter: Math.PI * od,
  };
}

type Box = Extract<SectionShape, { kind: "box" }>;

function box(shape: Box): SectionProperties {
  const { width, height, wall, outsideRadius, insideRadius } = shape;
  const [long, short] = [Math.max(width, height), Math.min(width, height)];
  const strong = aboutAxis(shape, short, long);
  const weak = aboutAxis(shape, long, short);
  const area =
    2 * wall * (width + height - 2 * wall) - (4 - Math.PI) * (outsideRadius ** 2 - insideRadius ** 2);
  return {
    area,
    i: strong.i,
    iMinor: weak.i,
    w: (2 * strong.i) / long,
    wMinor: (2 * weak.i) / short,
    wpl: strong.wpl,
    wplMinor: weak.wpl,
    radiusOfGyration: Math.sqrt(strong.i / area),
    radiusOfGyrationMinor: Math.sqrt(weak.i / area),
    ...torsionOf(shape),
    outsideRadius,
    insideRadius,
    perimeter: 2 * (width + height) - (8 - 2 * Math.PI) * outsideRadius,
  };
}

/**
 * A rounded rectangle about the axis across its depth: the sharp one less its four corners. A corner of radius r has
 * the area (1 − π/4)·r², its centroid at r·(10 − 3π)/(12 − 3π) from the sides, and the second moment
 * (1/3 − π/16 − 1/(36 − 9π))·r⁴ about it.
 */
function solid(breadth: number, depth: number, radius: number): { i: number; wpl: number } {
  const corner = (1 - Math.PI / 4) * radius ** 2;
  const arm = depth / 2 - (radius * (10 - 3 * Math.PI)) / (12 - 3 * Math.PI);
  const own = (1 / 3 - Math.PI / 16 - 1 / (36 - 9 * Math.PI)) * radius ** 4;
  return {
    i: (breadth * depth ** 3) / 12 - 4 * (own + corner * arm ** 2),
    wpl: (breadth * depth ** 2) / 4 - 4 * corner * arm,
  };
}

function aboutAxis({ wall, outsideRadius, insideRadius }: Box, breadth: number, depth: number) {
  const outside = solid(breadth, depth, outsideRadius);
  const inside = solid(breadth - 2 * wall, depth - 2 * wall, insideRadius);
  return { i: outside.i - inside.i, wpl: outside.wpl - inside.wpl };
}

/** It = t³·h/3 + 2·K·Ah and Ct = It / (t + K/t), K = 2·Ah·t/h, along the middle line of the wall. */
function torsionOf({ width, height, wall, outsideRadius, insideRadius }: Box) {
  const middle = (outsideRadius + insideRadius) / 2;
  const line = 2 * (width + height - 2 * wall) - 2 * middle * (4 - Math.PI);
  const enclosed = (width - wall) * (height - wall) - middle ** 2 * (4 - Math.PI);
  const k = (2 * enclosed * wall) / line;
  const torsion = (wall ** 3 * line) / 3 + 2 * k * enclosed;
  return { torsion, torsionModulus: torsion / (wall + k / wall) };
}
