import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { SectionInputs } from "./inputs.ts";

/** A section that can exist; mm. Round ones have a diameter, others two sides and two corner radii. */
export type SectionShape =
  | { kind: "round"; od: number; wall: number }
  | { kind: "box"; width: number; height: number; wall: number; outsideRadius: number; insideRadius: number };

interface CornerBand {
  /** Up to and with this wall, mm. */
  upTo: number;
  /** Radii in walls. */
  outside: number;
  inside: number;
}

/** Corner radii that the sectional properties are reckoned with: EN 10219-2, annex B; EN 10210-2, annex A. */
const cornerBands: Readonly<Record<SectionInputs["corners"], readonly CornerBand[]>> = {
  "cold-formed": [
    { upTo: 6, outside: 2, inside: 1 },
    { upTo: 10, outside: 2.5, inside: 1.5 },
    { upTo: Number.POSITIVE_INFINITY, outside: 3, inside: 2 },
  ],
  "hot-finished": [{ upTo: Number.POSITIVE_INFINITY, outside: 1.5, inside: 1 }],
  sharp: [{ upTo: Number.POSITIVE_INFINITY, outside: 0, inside: 0 }],
};

/**
 * Checks that the sizes of the shape are there and that the wall fits in it.
 *
 * @returns fails on the size that is missing, or on `wall` when it fills the tube or its corners would meet
 */
export function sectionShape(inputs: SectionInputs): Result<SectionShape, CalculatorIssue> {
  const { wall } = inputs;
  if (inputs.shape === "round") {
    const { od } = inputs;
    if (od === undefined) return missing("od", "A round tube needs its outside diameter in mm.");
    if (2 * wall >= od) return fail({ field: "wall", message: noBore(od) });
    return ok({ kind: "round", od, wall });
  }
  const square = inputs.shape === "square";
  const width = square ? inputs.side : inputs.width;
  const height = square ? inputs.side : inputs.height;
  if (width === undefined) {
    return square
      ? missing("side", "A square tube needs its side in mm.")
      : missing("width", "A rectangular tube needs its width in mm.");
  }
  if (height === undefined) return missing("height", "A rectangular tube needs its height in mm.");
  const least = Math.min(width, height);
  if (2 * wall >= least) return fail({ field: "wall", message: noBore(least) });
  const bands = cornerBands[inputs.corners];
  const band = bands.find(({ upTo }) => wall <= upTo) ?? { outside: 0, inside: 0 };
  if (band.inside * wall > least / 2 - wall + 1e-9) {
    return fail({ field: "wall", message: cornersMeet(bands, least) });
  }
  return ok({
    kind: "box",
    width,
    height,
    wall,
    outsideRadius: band.outside * wall,
    insideRadius: band.inside * wall,
  });
}

const missing = (field: string, message: string) => fail({ field, message });

function noBore(across: number): string {
  return `The wall leaves no bore: it must be less than half of ${across} mm (${across / 2} mm).`;
}

/** The thickest wall whose inside corners still fit; the bands only get tighter as the wall grows. */
function cornersMeet(bands: readonly CornerBand[], least: number): string {
  let from = 0;
  let thickest = 0;
  for (const { upTo, inside } of bands) {
    const fits = Math.min(upTo, least / (2 * (1 + inside)));
    if (fits > from) thickest = fits;
    from = upTo;
  }
  const limit = Math.floor(thickest * 100) / 100;
  return `At this wall the rounded corners would meet across ${least} mm: make it ${limit} mm or less, or choose sharp corners.`;
}
