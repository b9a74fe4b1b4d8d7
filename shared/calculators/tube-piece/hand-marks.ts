import type { TubePieceResults } from "./formula.ts";
import type { TubePieceInputs } from "./inputs.ts";

/**
 * The order in which a person marks and cuts the piece: common practice, no source.
 *
 * @param show writes a length given in mm
 */
export function pieceMarks(
  inputs: TubePieceInputs,
  { hardEnd, roughCut, tipToTip, ends }: TubePieceResults,
  show: (millimetres: number) => string,
): string[] {
  const first = hardEnd === "B" ? "B" : "A";
  const last = first === "A" ? "B" : "A";
  const depth = { A: ends[0].deepest, B: ends[1].deepest };
  const turn = Math.abs(inputs.clock) % 360;
  const round = show((Math.PI * inputs.branchOd * turn) / 360);
  const way = inputs.clock > 0 ? "counter-clockwise" : "clockwise";
  return [
    `Saw the tube square to ${show(roughCut)}.`,
    "Scribe one line along the whole tube: the datum. It is the heel of end A.",
    turn === 0
      ? "The heel of end B lies on the same line."
      : `Looking from A to B, measure ${round} round the tube, ${way} from the datum, and scribe a short line at end B: its heel.`,
    `Cut end ${first} first${hardEnd === "either" ? "" : ", the hard one"}: up to ${show(depth[first])} deep. Try it on its joint until it fits.`,
    `From the longest point of end ${first}, measure ${show(tipToTip)} along the tube: there is the longest point of end ${last}. Square a line round.`,
    `Mark end ${last} from that line, up to ${show(depth[last])} deep, cut on the waste side, and trim it to the work itself.`,
  ];
}
