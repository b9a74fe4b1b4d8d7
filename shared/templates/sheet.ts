/** A place on the sheet in mm: x to the right, y downward, as print and SVG have it. */
export type Point = readonly [x: number, y: number];

/**
 * What a line means; each writer gives it a pen or a DXF layer.
 * `cut` is followed by scissors or laser, `inside` is for reference only, `datum` is set on a line of the tube.
 */
export type Layer = "cut" | "inside" | "datum" | "guide" | "edge" | "check";

export interface SheetLine {
  layer: Layer;
  points: readonly Point[];
}

export interface SheetLabel {
  at: Point;
  text: string;
  /** Height of the letters' em, mm. */
  size: number;
  anchor: "start" | "middle" | "end";
}

/** The ends of a drawing, mm. */
export interface Bounds {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

/**
 * A full-size template in mm, before any paper: PDF, SVG and DXF are all drawn from it, so that they cannot differ.
 */
export interface TemplateSheet {
  bounds: Bounds;
  lines: readonly SheetLine[];
  labels: readonly SheetLabel[];
  /** What was worked with, for the head of a printed sheet. */
  facts: readonly { label: string; value: string }[];
  /** How to lay it on the work, one sentence each. */
  instructions: readonly string[];
}

/** Whose template it is: printed on every sheet and written on the strip. */
export interface TemplateNames {
  build: string;
  /** "W12 Lower wishbone, front leg"; or the calculator's name when it is no kept working. */
  working: string;
  date: string;
}

/** A line of text no wider than `room`, shrunk if need be; left out when it would be too small to read. */
export function fittedLabel(at: Point, text: string, size: number, room: number): SheetLabel[] {
  // Sans faces average about 0.55 em a letter; 1.4 mm is the smallest anyone reads on paper.
  const fitted = Math.min(size, room / (0.55 * Math.max(1, text.length)));
  return fitted < 1.4 ? [] : [{ at, text, size: fitted, anchor: "start" }];
}
