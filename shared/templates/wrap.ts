import {
  fittedLabel,
  type Point,
  type SheetLabel,
  type SheetLine,
  type TemplateNames,
  type TemplateSheet,
} from "./sheet.ts";

/** Steps of a drawn curve: a multiple of four, so that it passes exactly through the quarter lines. */
const steps = 720;

/** Paper left below the deepest cut to hold on to and to write on, mm. */
export const wrapSkirt = 34;

/** Free paper drawn round a strip, mm. */
export const wrapSurround = 3;

/** One tube end to be drawn as a wrap: lengths in mm, places round the tube in degrees. */
export interface WrappedEnd {
  /** Once round the tube with the paper. */
  width: number;
  deepest: number;
  /** Depth from the squared end, on the outside and on the bore. */
  outside(around: number): number;
  bore(around: number): number;
  /** Name and depth at 0°, 90°, 180° and 270°. */
  quarters: readonly (readonly [name: string, depth: number])[];
  /** What it was worked with, two lines. */
  about: readonly [string, string];
}

interface Strip {
  width: number;
  deepest: number;
  bottom: number;
}

/**
 * The wrap template of one tube end, full size in mm. The squared end is y = 0 and the tube runs downward; x runs round
 * the tube from heel to heel, print outward. The paper below the solid curve stays on the tube.
 */
export function wrapTemplate(
  end: WrappedEnd,
  names: TemplateNames,
): Pick<TemplateSheet, "bounds" | "lines" | "labels"> {
  const strip = { width: end.width, deepest: end.deepest, bottom: end.deepest + wrapSkirt };
  return {
    bounds: {
      left: -wrapSurround,
      top: -6,
      right: strip.width + wrapSurround,
      bottom: strip.bottom + wrapSurround,
    },
    lines: [
      { layer: "cut", points: wrapCurve(end.width, end.outside) },
      { layer: "inside", points: wrapCurve(end.width, end.bore) },
      ...frame(strip),
      ...degreeTicks(strip),
      ...wrapArrow([strip.width / 8, strip.deepest + 21.5]),
    ],
    labels: [
      ...quarterLabels(strip, end.quarters),
      ...degreeLabels(strip),
      ...stripNames(strip, end.about, names),
    ],
  };
}

/** A curve once round the tube; `at` gives its y in mm at a place in degrees. */
export function wrapCurve(width: number, at: (around: number) => number): Point[] {
  return Array.from(
    { length: steps + 1 },
    (_, step): Point => [(width * step) / steps, at((360 * step) / steps)],
  );
}

/** A straight line of a sheet. */
export function straight(layer: SheetLine["layer"], from: Point, to: Point): SheetLine {
  return { layer, points: [from, to] };
}

function frame({ width, deepest, bottom }: Strip): SheetLine[] {
  // The quarter lines leave the names and the degree scale clear.
  const clear = deepest + 11.5;
  return [
    straight("datum", [0, 0], [0, bottom]),
    straight("datum", [width, 0], [width, bottom]),
    straight("guide", [width / 4, 0], [width / 4, clear]),
    straight("datum", [width / 2, 0], [width / 2, bottom - 7]),
    straight("guide", [(width * 3) / 4, 0], [(width * 3) / 4, clear]),
    straight("guide", [0, 0], [width, 0]),
    straight("edge", [0, bottom], [width, bottom]),
  ];
}

function degreeTicks({ width, bottom }: Strip): SheetLine[] {
  return Array.from({ length: 37 }, (_, index): SheetLine => {
    const x = (width * index) / 36;
    return straight("edge", [x, bottom], [x, bottom - (index % 3 === 0 ? 3 : 1.5)]);
  });
}

function degreeLabels({ width, bottom }: Strip): SheetLabel[] {
  // Twelve numbers need about 8 mm each to stay apart.
  const every = width / 12 >= 8 ? 30 : 90;
  return Array.from({ length: 360 / every - 1 }, (_, index) => {
    const around = every * (index + 1);
    return { at: [(width * around) / 360, bottom - 3.8], text: `${around}`, size: 2.2, anchor: "middle" };
  });
}

function quarterLabels({ width, deepest }: Strip, quarters: WrappedEnd["quarters"]): SheetLabel[] {
  const size = quarterSize(width);
  return quarters.flatMap(([name, depth], index): SheetLabel[] => {
    const x = (width * index) / 4 + 1.2;
    return [
      { at: [x, deepest + 5], text: name, size, anchor: "start" },
      { at: [x, deepest + 5 + size * 1.25], text: `${depth.toFixed(1)} deep`, size, anchor: "start" },
    ];
  });
}

/** Letters that fit beside a quarter line, mm. */
export function quarterSize(width: number): number {
  return Math.max(1.7, Math.min(3, width / 44));
}

function stripNames(
  { width, deepest }: Strip,
  about: WrappedEnd["about"],
  names: TemplateNames,
): SheetLabel[] {
  const room = width / 2 - 2.4;
  const [left, right] = [1.2, width / 2 + 1.2];
  return [
    ...fittedLabel([left, deepest + 15.5], names.build, 3, room),
    ...fittedLabel([left, deepest + 19.5], names.working, 3, room),
    ...fittedLabel([right, deepest + 15.5], about[0], 3, room),
    ...fittedLabel([width / 8 + 3, deepest + 25.5], "cut end up", 2.6, (width * 3) / 8 - 4),
    ...fittedLabel([right, deepest + 19.5], about[1], 3, room),
  ];
}

/** An arrow of 6 mm pointing up, its tip at the place. */
export function wrapArrow([x, tip]: Point): SheetLine[] {
  return [
    straight("datum", [x, tip + 6], [x, tip]),
    {
      layer: "datum",
      points: [
        [x - 1.5, tip + 2.5],
        [x, tip],
        [x + 1.5, tip + 2.5],
      ],
    },
  ];
}
