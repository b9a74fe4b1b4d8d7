import type { Bounds, Point, SheetLabel, SheetLine, TemplateSheet } from "./sheet.ts";

const inch = 25.4;

/** Length of the metric bar, mm. */
export const metricBar = 100;

/** Length of the bar for an inch rule: 4 in, in mm. */
export const inchBar = 4 * inch;

/** Height that both bars take, mm. */
export const checkBarsHeight = 13;

/**
 * Two bars to lay a rule on before anything is cut: 100 mm over 4 in, each measured from the outer edge of one end
 * tick's centre line to the other's.
 *
 * @param origin left end of the metric bar, mm
 */
export function checkBars(origin: Point): { lines: SheetLine[]; labels: SheetLabel[] } {
  const metric = bar(origin, metricBar, 10, 10);
  const imperial = bar([origin[0], origin[1] + 8], inchBar, 8, 2);
  return {
    lines: [...metric, ...imperial],
    labels: [
      { at: [origin[0] + metricBar + 2, origin[1] + 1.1], text: "100 mm", size: 3, anchor: "start" },
      { at: [origin[0] + inchBar + 2, origin[1] + 9.1], text: "4 in", size: 3, anchor: "start" },
    ],
  };
}

/** A bar with end ticks that stand above and below, and `parts` small divisions, every `major`-th of them taller. */
function bar([x, y]: Point, length: number, parts: number, major: number): SheetLine[] {
  const ticks = Array.from({ length: parts + 1 }, (_, index): SheetLine => {
    const at = x + (length * index) / parts;
    const end = index === 0 || index === parts;
    const rise = end ? 3 : index % major === 0 ? 2 : 1.2;
    return {
      layer: "check",
      points: [
        [at, y - rise],
        [at, end ? y + 1.5 : y],
      ],
    };
  });
  return [
    {
      layer: "check",
      points: [
        [x, y],
        [x + length, y],
      ],
    },
    ...ticks,
  ];
}

/** How far the bars stand in from the drawing's left end, mm. */
const indent = 5;

/** The sheet with its check bars below, and how far both reach: what a single-sheet writer draws. */
export function withCheckBars(sheet: TemplateSheet) {
  const { left, right, top, bottom } = sheet.bounds;
  const bars = checkBars([left + indent, bottom + 6]);
  const bounds: Bounds = {
    left,
    top,
    right: Math.max(right, left + indent + inchBar + 20),
    bottom: bottom + 6 + checkBarsHeight,
  };
  return { bounds, lines: [...sheet.lines, ...bars.lines], labels: [...sheet.labels, ...bars.labels] };
}
