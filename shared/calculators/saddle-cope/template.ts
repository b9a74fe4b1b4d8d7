import {
  fittedLabel,
  type Point,
  type SheetLabel,
  type SheetLine,
  type TemplateNames,
  type TemplateSheet,
} from "#shared/templates/sheet.ts";
import { distanceFromAxis, joint, type SaddleCopeResults } from "./formula.ts";
import type { SaddleCopeInputs } from "./inputs.ts";

/** Steps of the drawn curve: a multiple of four, so that it passes exactly through the quarter lines. */
const steps = 720;

/** Paper left below the deepest cut to hold on to and to write on, mm. */
const skirt = 34;

/** Free paper drawn round the strip, mm. */
const surround = 3;

interface Strip {
  width: number;
  deepest: number;
  bottom: number;
}

/**
 * The wrap template of a cope, full size in mm. The squared end is y = 0 and the tube runs downward; x runs round the
 * tube from heel to heel, print outward. The paper below the solid curve stays on the tube.
 */
export function copeTemplate(
  inputs: SaddleCopeInputs,
  results: SaddleCopeResults,
  names: TemplateNames,
): TemplateSheet {
  const strip = {
    width: results.templateWidth,
    deepest: results.deepest,
    bottom: results.deepest + skirt,
  };
  return {
    bounds: { left: -surround, top: -6, right: strip.width + surround, bottom: strip.bottom + surround },
    lines: [...curves(inputs, results), ...frame(strip), ...degreeTicks(strip), ...upArrow(strip)],
    labels: [...quarterLabels(strip, results), ...degreeLabels(strip), ...stripNames(strip, inputs, names)],
    facts: facts(inputs, results),
    instructions: [
      "Cut along the solid curve. The dashed line is the bore: for reference, do not cut it.",
      "Wrap it print outward, arrow toward the coped end, with both HEEL lines on the heel line of the tube.",
    ],
  };
}

function curves(inputs: SaddleCopeInputs, results: SaddleCopeResults): SheetLine[] {
  const tube = joint(inputs);
  const line = (radius: number) =>
    Array.from({ length: steps + 1 }, (_, step): Point => {
      const around = (360 * step) / steps;
      const depth = distanceFromAxis(tube, radius, around) - results.tipFromAxis;
      return [(results.templateWidth * step) / steps, depth];
    });
  return [
    { layer: "cut", points: line(tube.r) },
    { layer: "inside", points: line(tube.bore) },
  ];
}

function frame({ width, deepest, bottom }: Strip): SheetLine[] {
  const upright = (layer: SheetLine["layer"], x: number, from: number, to: number): SheetLine => ({
    layer,
    points: [
      [x, from],
      [x, to],
    ],
  });
  // The quarter lines leave the names and the degree scale clear.
  const clear = deepest + 11.5;
  return [
    upright("datum", 0, 0, bottom),
    upright("datum", width, 0, bottom),
    upright("guide", width / 4, 0, clear),
    upright("datum", width / 2, 0, bottom - 7),
    upright("guide", (width * 3) / 4, 0, clear),
    {
      layer: "guide",
      points: [
        [0, 0],
        [width, 0],
      ],
    },
    {
      layer: "edge",
      points: [
        [0, bottom],
        [width, bottom],
      ],
    },
  ];
}

function degreeTicks({ width, bottom }: Strip): SheetLine[] {
  return Array.from({ length: 37 }, (_, index): SheetLine => {
    const x = (width * index) / 36;
    return {
      layer: "edge",
      points: [
        [x, bottom],
        [x, bottom - (index % 3 === 0 ? 3 : 1.5)],
      ],
    };
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

function quarterLabels({ width, deepest }: Strip, results: SaddleCopeResults): SheetLabel[] {
  const size = Math.max(1.7, Math.min(3, width / 44));
  const places = [
    ["HEEL", results.heelDepth],
    ["90° SIDE", results.sideDepth.at90],
    ["TOE", results.toeDepth],
    ["270° SIDE", results.sideDepth.at270],
  ] as const;
  return places.flatMap(([name, depth], index): SheetLabel[] => {
    const x = (width * index) / 4 + 1.2;
    return [
      { at: [x, deepest + 5], text: name, size, anchor: "start" },
      { at: [x, deepest + 5 + size * 1.25], text: `${depth.toFixed(1)} deep`, size, anchor: "start" },
    ];
  });
}

function stripNames({ width, deepest }: Strip, inputs: SaddleCopeInputs, names: TemplateNames): SheetLabel[] {
  const room = width / 2 - 2.4;
  const [left, right] = [1.2, width / 2 + 1.2];
  return [
    ...fittedLabel([left, deepest + 15.5], names.build, 3, room),
    ...fittedLabel([left, deepest + 19.5], names.working, 3, room),
    ...fittedLabel(
      [right, deepest + 15.5],
      `${inputs.branchOd} × ${inputs.branchWall} on ${inputs.headerOd} mm`,
      3,
      room,
    ),
    ...fittedLabel([width / 8 + 3, deepest + 25.5], "coped end up", 2.6, (width * 3) / 8 - 4),
    ...fittedLabel(
      [right, deepest + 19.5],
      `at ${inputs.angle}°, offset ${inputs.offset} mm, ${names.date}`,
      3,
      room,
    ),
  ];
}

/** Points to the coped end, midway between heel and 90° side. */
function upArrow({ width, deepest }: Strip): SheetLine[] {
  const x = width / 8;
  const [tip, tail] = [deepest + 21.5, deepest + 27.5];
  return [
    {
      layer: "datum",
      points: [
        [x, tail],
        [x, tip],
      ],
    },
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

function facts(inputs: SaddleCopeInputs, results: SaddleCopeResults) {
  return [
    { label: "Header", value: `${inputs.headerOd} mm` },
    { label: "Branch", value: `${inputs.branchOd} × ${inputs.branchWall} mm` },
    { label: "Angle", value: `${inputs.angle}°` },
    { label: "Offset", value: `${inputs.offset} mm` },
    { label: "Deepest cut", value: `${results.deepest.toFixed(1)} mm` },
    { label: "Wrap length", value: `${results.templateWidth.toFixed(1)} mm` },
    { label: "Paper", value: `${inputs.paperThickness} mm` },
  ];
}
