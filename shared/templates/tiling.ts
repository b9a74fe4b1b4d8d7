import { fail, ok, type Result } from "#shared/result.ts";
import type { Bounds, Point } from "./sheet.ts";

/** Papers a template can be printed on, mm: ISO 216 A4, and ANSI/ASME Y14.1 size A (Letter). */
export const papers = {
  a4: { label: "A4", width: 210, height: 297 },
  letter: { label: "Letter", width: 215.9, height: 279.4 },
} as const;

export type Paper = keyof typeof papers;

/** Unprinted border, the head with names and facts, the foot with check bars and cautions; mm. */
export const pageMargin = 12;
export const headHeight = 37;
export const footHeight = 43;

/** How much of the drawing neighbouring pages share, mm. */
export const overlap = 12;

/** More pages than anyone would tape together: a plotter or a laser does it better. */
const mostPages = 40;

/** One printed page: the part of the sheet that its window shows, and the pages that join it. */
export interface Tile {
  page: number;
  x: number;
  y: number;
  neighbours: { left?: number; right?: number; up?: number; down?: number };
}

export interface Tiling {
  page: { width: number; height: number };
  /** Where on the page the drawing goes, mm. */
  window: { x: number; y: number; width: number; height: number };
  tiles: Tile[];
  /** Crosses that appear on both pages of a seam, in the sheet's own mm. */
  marks: Point[];
}

/**
 * Cuts a sheet into printed pages at exactly 1:1, standing or lying, whichever takes fewer.
 *
 * @param bounds of the sheet, mm
 * @returns fails when it would take more pages than anyone would tape together
 */
export function tileSheet(bounds: Bounds, paper: Paper): Result<Tiling, { message: string }> {
  const { width, height } = papers[paper];
  const upright = layOut(bounds, width, height);
  const lying = layOut(bounds, height, width);
  const best = lying.columns * lying.rows < upright.columns * upright.rows ? lying : upright;
  const pages = best.columns * best.rows;
  if (pages > mostPages) {
    return fail({
      message: `This template would take ${pages} pages of ${papers[paper].label}. Take the SVG or DXF to a plotter or a laser cutter instead.`,
    });
  }
  return ok({ page: best.page, window: best.window, tiles: tiles(best), marks: seamMarks(best) });
}

interface Grid {
  page: { width: number; height: number };
  window: Tiling["window"];
  bounds: Bounds;
  columns: number;
  rows: number;
}

function layOut(bounds: Bounds, pageWidth: number, pageHeight: number): Grid {
  const window = {
    x: pageMargin,
    y: pageMargin + headHeight,
    width: pageWidth - 2 * pageMargin,
    height: pageHeight - 2 * pageMargin - headHeight - footHeight,
  };
  const count = (length: number, shown: number) =>
    length <= shown ? 1 : Math.ceil((length - overlap) / (shown - overlap));
  return {
    page: { width: pageWidth, height: pageHeight },
    window,
    bounds,
    columns: count(bounds.right - bounds.left, window.width),
    rows: count(bounds.bottom - bounds.top, window.height),
  };
}

/** Where the tiles of one direction begin; a single one is centred in its window. */
function starts(from: number, to: number, shown: number, count: number): number[] {
  if (count === 1) return [from - (shown - (to - from)) / 2];
  return Array.from({ length: count }, (_, index) => from + index * (shown - overlap));
}

function tiles({ bounds, window, columns, rows }: Grid): Tile[] {
  const left = starts(bounds.left, bounds.right, window.width, columns);
  const top = starts(bounds.top, bounds.bottom, window.height, rows);
  return top.flatMap((y, row) =>
    left.map((x, column) => {
      const page = row * columns + column + 1;
      return {
        page,
        x,
        y,
        neighbours: {
          ...(column > 0 && { left: page - 1 }),
          ...(column < columns - 1 && { right: page + 1 }),
          ...(row > 0 && { up: page - columns }),
          ...(row < rows - 1 && { down: page + columns }),
        },
      };
    }),
  );
}

/** Two crosses on each seam between two pages, in the middle of what both show. */
function seamMarks({ bounds, window, columns, rows }: Grid): Point[] {
  const left = starts(bounds.left, bounds.right, window.width, columns);
  const top = starts(bounds.top, bounds.bottom, window.height, rows);
  const along = (from: number, shown: number, least: number, most: number) =>
    [0.25, 0.75].map((share) => {
      const low = Math.max(from + overlap, least);
      return low + (Math.min(from + shown - overlap, most) - low) * share;
    });
  const across = left
    .slice(1)
    .flatMap((x) =>
      top.flatMap((y) =>
        along(y, window.height, bounds.top, bounds.bottom).map((at): Point => [x + overlap / 2, at]),
      ),
    );
  const down = top
    .slice(1)
    .flatMap((y) =>
      left.flatMap((x) =>
        along(x, window.width, bounds.left, bounds.right).map((at): Point => [at, y + overlap / 2]),
      ),
    );
  return [...across, ...down];
}
