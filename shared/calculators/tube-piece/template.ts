import {
  fittedLabel,
  type SheetLabel,
  type SheetLine,
  type TemplateNames,
  type TemplateSheet,
} from "#shared/templates/sheet.ts";
import {
  quarterSize,
  straight,
  wrapArrow,
  wrapCurve,
  wrapSkirt,
  wrapSurround,
} from "#shared/templates/wrap.ts";
import { type EndCut, endCut } from "./end-cut.ts";
import type { TubePieceResults } from "./formula.ts";
import type { TubePieceInputs } from "./inputs.ts";

/** Free paper between the two wraps, mm. */
const between = 12;

/** Where one end's wrap lies: its squared end, its other edge, and the y of a depth, in mm. */
interface Wrap {
  name: "A" | "B";
  /** A square end is alike all round. */
  hasHeel: boolean;
  squared: number;
  edge: number;
  at(depth: number): number;
  depth(radius: number, around: number): number;
}

/**
 * Two wraps on one sheet, full size in mm, both with A toward the top and both from one datum, A's heel, at x = 0. The
 * plain tube between them is left out: the squared ends are set the length of the piece apart.
 */
export function pieceTemplate(
  inputs: TubePieceInputs,
  results: TubePieceResults,
  names: TemplateNames,
): TemplateSheet {
  const wraps = wrapsOf(inputs, results);
  const { width } = results.strip;
  return {
    bounds: {
      left: -wrapSurround,
      top: -6,
      right: width + wrapSurround,
      bottom: (wraps[1]?.squared ?? 0) + 6,
    },
    lines: wraps.flatMap((wrap) => wrapLines(wrap, inputs, results)),
    labels: wraps.flatMap((wrap) => wrapLabels(wrap, inputs, results, names)),
    facts: [
      { label: "Tube", value: `${inputs.branchOd} × ${inputs.branchWall} mm` },
      { label: "Tip to tip", value: `${results.tipToTip.toFixed(1)} mm` },
      { label: "Rough cut", value: `${results.roughCut.toFixed(1)} mm` },
      { label: "Clock", value: `${inputs.clock}°` },
      { label: "Hard end", value: results.hardEnd },
      { label: "Wrap length", value: `${width.toFixed(1)} mm` },
      { label: "Paper", value: `${inputs.paperThickness} mm` },
    ],
    instructions: [
      "Scribe the datum along the whole tube. Wrap both strips print outward, arrows toward A, DATUM lines on it.",
      `Set the two squared ends ${results.tipToTip.toFixed(1)} mm apart, strips between them.`,
      `Cut along the solid curves${results.hardEnd === "either" ? "" : `, end ${results.hardEnd} first`}. Dashed is the bore.`,
    ],
  };
}

function wrapsOf(inputs: TubePieceInputs, { ends }: TubePieceResults): Wrap[] {
  const [endA, endB] = inputs.ends;
  const a = endA && endCut(inputs, endA, 0);
  const b = endB && endCut(inputs, endB, 1);
  // The results exist, so both ends were found to be good.
  if (!a?.ok || !b?.ok) return [];
  const depthOf = (cut: EndCut, turned: (around: number) => number) => (radius: number, around: number) =>
    cut.fromAxis(radius, turned(around)) - cut.tip;
  const edgeA = ends[0].deepest + wrapSkirt;
  const edgeB = edgeA + between;
  const tipB = edgeB + wrapSkirt + ends[1].deepest;
  return [
    {
      name: "A",
      hasHeel: endA?.kind !== "square",
      squared: 0,
      edge: edgeA,
      at: (depth) => depth,
      depth: depthOf(a.value, (around) => around),
    },
    {
      name: "B",
      hasHeel: endB?.kind !== "square",
      squared: tipB,
      edge: edgeB,
      at: (depth) => tipB - depth,
      depth: depthOf(b.value, (around) => inputs.clock - around),
    },
  ];
}

function wrapLines(wrap: Wrap, inputs: TubePieceInputs, { strip }: TubePieceResults): SheetLine[] {
  const { width, heelB } = strip;
  const outside = inputs.branchOd / 2;
  const upright = (layer: SheetLine["layer"], x: number, to = wrap.edge) =>
    straight(layer, [x, wrap.squared], [x, to]);
  const curve = (radius: number) => wrapCurve(width, (around) => wrap.at(wrap.depth(radius, around)));
  // Quarter lines stop short of the words.
  const clear = wrap.name === "A" ? wrap.edge - 17.5 : wrap.edge + 14.5;
  return [
    { layer: "cut", points: curve(outside) },
    { layer: "inside", points: curve(outside - inputs.branchWall) },
    upright("datum", 0),
    upright("datum", width),
    ...[1, 2, 3].map((quarter) => upright("guide", (width * quarter) / 4, clear)),
    ...(wrap.name === "B" && wrap.hasHeel && heelB > 0 ? [upright("datum", heelB, clear)] : []),
    straight("guide", [0, wrap.squared], [width, wrap.squared]),
    straight("edge", [0, wrap.edge], [width, wrap.edge]),
    ...wrapArrow([width / 2 + 3, namesTop(wrap) - 2]),
  ];
}

/** Baselines of the first row beside the lines, next to the cut, and of the names, next to the other edge; mm. */
const linesTop = ({ name, edge }: Wrap) => (name === "A" ? edge - 29 : edge + 19);
const namesTop = ({ name, edge }: Wrap) => (name === "A" ? edge - 12 : edge + 8);

function wrapLabels(
  wrap: Wrap,
  inputs: TubePieceInputs,
  { strip }: TubePieceResults,
  names: TemplateNames,
): SheetLabel[] {
  const { width, heelB } = strip;
  const size = quarterSize(width);
  const top = linesTop(wrap);
  const low = namesTop(wrap);
  const room = width / 2 - 2.4;
  const quarters = [0, 90, 180, 270].flatMap((around): SheetLabel[] => {
    const x = (width * around) / 360 + 1.2;
    const depth = Math.max(0, wrap.depth(inputs.branchOd / 2, around));
    return [
      { at: [x, top], text: around === 0 ? "DATUM" : `${around}°`, size, anchor: "start" },
      { at: [x, top + size * 1.25], text: `${depth.toFixed(1)} deep`, size, anchor: "start" },
    ];
  });
  const heel = wrap.name === "A" ? 0 : heelB;
  const heelAnchor = heel > width * 0.8 ? "end" : "start";
  return [
    ...quarters,
    ...(wrap.hasHeel
      ? [
          {
            at: [heel + (heelAnchor === "start" ? 1.2 : -1.2), top + size * 2.5 + 0.6],
            text: `${wrap.name} HEEL`,
            size,
            anchor: heelAnchor,
          } as const,
        ]
      : []),
    ...fittedLabel([1.2, low], names.build, 3, room),
    ...fittedLabel([1.2, low + 4], names.working, 3, room),
    ...fittedLabel(
      [width / 2 + 6, low],
      `end ${wrap.name} ${wrap.name === "A" ? "up" : "down"}`,
      3,
      room - 4,
    ),
    ...fittedLabel([width / 2 + 6, low + 4], `clock ${inputs.clock}°, ${names.date}`, 3, room - 4),
  ];
}
