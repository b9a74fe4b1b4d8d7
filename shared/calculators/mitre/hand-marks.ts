import type { MitreResults } from "./formula.ts";
import type { MitreInputs } from "./inputs.ts";

/**
 * The steps for marking the mitre by hand with a square and a marker: common practice, no source.
 *
 * @param show writes a length given in mm
 */
export function mitreMarks(
  inputs: MitreInputs,
  results: MitreResults,
  show: (millimetres: number) => string,
): string[] {
  const quarter = show((Math.PI * inputs.od) / 4);
  return [
    "Cut both tubes square at the ends that meet, with the toe's length: the toe loses nothing.",
    `Draw a line along each tube: this is the heel, on the inside of the corner. Round the tube, mark three more lines ${quarter} apart.`,
    `From the squared end, mark the depth on each line: heel ${show(results.heelDepth)}, both sides ${show(results.sideDepth.at90)}, toe nothing.`,
    "Pull a strip of card with a straight edge tight through the marks and trace it, or wrap the template.",
    `Or set the saw ${Number(results.cutAngle.toFixed(2))}° off square, with the heel line up, and cut through heel mark and toe.`,
    "Put the two cuts together, heel to heel, on a flat table. Check the turn, then file where light shows.",
  ];
}
