import type { SaddleCopeInputs } from "./inputs.ts";

interface MarkedNumbers {
  heelDepth: number;
  toeDepth: number;
  sideDepth: { at90: number; at270: number };
  insideRelief: number;
  holeSaw: { fromTip: number };
}

const millimetres = (length: number) => `${Number(length.toFixed(1))} mm`;

/** How long to cut the tube before its end is coped; `show` as in `handMarks`. */
export function roughCutNote(
  { allowance }: SaddleCopeInputs,
  show: (length: number) => string = millimetres,
): string {
  if (allowance === 0) return "No spare length: the tube is cut to its finished length before the cope.";
  return `Cut the tube ${show(allowance)} over its finished length, cope this end, and trim the other end last.`;
}

/**
 * The steps for marking the cope by hand with a square, a marker and an offcut of the header.
 *
 * @param show writes a length given in mm; the screen passes its own for a person who works in inches
 */
export function handMarks(
  inputs: SaddleCopeInputs,
  numbers: MarkedNumbers,
  show: (millimetres: number) => string = millimetres,
): string[] {
  const { heelDepth, toeDepth, sideDepth } = numbers;
  const quarter = show((Math.PI * inputs.branchOd) / 4);
  return [
    roughCutNote(inputs, show),
    "Cut the branch end square. Check it with the square from two sides.",
    `Draw a line along the tube: this is the heel. Round the tube, mark three more lines ${quarter} apart. Looking at the end, counter-clockwise from the heel: 90° side, toe, 270° side.`,
    `From the squared end, mark the depth on each line: heel ${show(heelDepth)}, 90° side ${show(sideDepth.at90)}, toe ${show(toeDepth)}, 270° side ${show(sideDepth.at270)}.`,
    offcutStep(inputs, numbers, show),
    "Cut on the waste side of the line, then grind or file to it.",
    insideStep(numbers.insideRelief, show),
    "Try it on the header at the angle. Blue or chalk shows where it touches; take that off until it touches all round.",
  ];
}

function offcutStep(
  inputs: SaddleCopeInputs,
  numbers: MarkedNumbers,
  show: (length: number) => string,
): string {
  const centre = Math.abs(numbers.holeSaw.fromTip) < 0.05 ? "on the squared end" : beyondEnd(numbers, show);
  const sideways =
    inputs.offset === 0
      ? ""
      : ` Set its centre ${show(Math.abs(inputs.offset))} off the branch centre line, toward the ${inputs.offset > 0 ? "270°" : "90°"} side.`;
  return `Hold an offcut of the header (${show(inputs.headerOd)}) end-on against the 90° side, at ${inputs.angle}° to the branch and leaning toward the heel, its centre ${centre}, so that its rim passes the marks.${sideways} Trace round it, do the same on the 270° side, and join the marks with an even curve.`;
}

function beyondEnd(numbers: MarkedNumbers, show: (length: number) => string): string {
  return `${show(Math.abs(numbers.holeSaw.fromTip))} beyond the squared end`;
}

function insideStep(relief: number, show: (length: number) => string): string {
  if (relief < 0.05) return "The bore needs no relief: cut straight through the wall.";
  return `Relieve the bore: on the inside the cut goes up to ${show(relief)} further back than on the outside.`;
}
