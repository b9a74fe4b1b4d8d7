import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { SheetBendInputs } from "./inputs.ts";

/** One bend; mm. */
export interface SheetBend {
  /** Length of sheet that the bend uses up. */
  allowance: number;
  /** From where the bend begins to where the outside faces would meet. */
  setback: number;
  /** What two outside lengths count too much: 2·setback − allowance. */
  deduction: number;
}

/** Results of `sheet-bend`; mm. */
export interface SheetBendResults {
  bends: SheetBend[];
  flatLength: number;
  /** Middle of each bend on the flat sheet, from the edge of the first flange. */
  bendLines: number[];
  /** Flat parts left between the bends, one for each flange. */
  flats: number[];
}

/**
 * Flat length of a bent sheet.
 *
 * allowance = π/180·A·(R + K·T); setback = (R + T)·tan(A/2); flat = Σ flanges − Σ (2·setback − allowance).
 *
 * @param inputs parsed by `sheetBendInputs`
 * @returns fails on `angles` when their number does not fit the flanges, and on `flanges.n` when a flange is shorter
 * than its bends
 * @see Machinery's Handbook, "Sheet metal: lengths of straight stock for bends", in the K-factor form
 */
export function sheetBend(inputs: SheetBendInputs): Result<SheetBendResults, CalculatorIssue> {
  const { flanges, angles } = inputs;
  if (angles.length !== flanges.length - 1) {
    const message = `${flanges.length} flanges meet in ${flanges.length - 1} bends, but ${angles.length} angles were given: give ${flanges.length - 1}.`;
    return fail({ field: "angles", message });
  }
  const bends = angles.map((angle) => bendAt(inputs, Math.abs(angle)));
  const taken = flanges.map((_, index) => (bends[index - 1]?.setback ?? 0) + (bends[index]?.setback ?? 0));
  const flats = flanges.map((flange, index) => flange - (taken[index] ?? 0));
  const short = flats.findIndex((flat) => flat < 0);
  if (short >= 0) return fail({ field: `flanges.${short}`, message: tooShort(short, taken[short] ?? 0) });
  const bendLines: number[] = [];
  let from = 0;
  for (const [index, { allowance }] of bends.entries()) {
    from += flats[index] ?? 0;
    bendLines.push(from + allowance / 2);
    from += allowance;
  }
  return ok({ bends, flatLength: from + (flats.at(-1) ?? 0), bendLines, flats });
}

function bendAt({ insideRadius, thickness, kFactor }: SheetBendInputs, angle: number): SheetBend {
  const radians = (angle * Math.PI) / 180;
  const allowance = radians * (insideRadius + kFactor * thickness);
  const setback = (insideRadius + thickness) * Math.tan(radians / 2);
  return { allowance, setback, deduction: 2 * setback - allowance };
}

function tooShort(index: number, least: number): string {
  const needed = Math.ceil(least * 10) / 10;
  return `Flange ${index + 1} is shorter than its bends take up: make it at least ${needed} mm, or the inside radius smaller.`;
}
