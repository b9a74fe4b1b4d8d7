import { describe, expect, it } from "vitest";
import type { FilletWeldResults } from "#shared/calculators/fillet-weld/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

/**
 * Published design table of fillet weld resistances to EN 1993-1-8, 4.5.3 ("Blue Book", read in a stored public copy):
 * throat in mm, then kN/mm along and across the weld for S355. It takes fu = 470 MPa, βw = 0.9, γM2 = 1.25, and 0.7 of
 * the leg as throat. Printed to two decimals.
 */
const s355 = [
  [2.1, 0.51, 0.62],
  [2.8, 0.68, 0.83],
  [3.5, 0.84, 1.03],
  [4.2, 1.01, 1.24],
  [5.6, 1.35, 1.65],
  [7, 1.69, 2.07],
  [10.5, 2.53, 3.1],
  [17.5, 4.22, 5.17],
] as const;

/** The same table for S460: fu = 540 MPa, βw = 1. */
const s460 = [
  [2.8, 0.7, 0.86],
  [4.2, 1.05, 1.28],
  [7, 1.75, 2.14],
  [12.6, 3.14, 3.85],
] as const;

function perMm(inputs: object) {
  return resultsOf<FilletWeldResults>("fillet-weld", { length: 200, ...inputs }).resistancePerMm / 1000;
}

describe("fillet-weld against a published design table", () => {
  it.each(s355)(
    "holds a throat of %d mm in S355 to %d along and %d kN/mm across",
    (throat, along, across) => {
      const weld = { throat, ultimate: 470, correlation: 0.9 };
      expect(Math.abs(perMm(weld) - along)).toBeLessThan(0.0055);
      expect(Math.abs(perMm({ ...weld, method: "directional", loadAngle: 90 }) - across)).toBeLessThan(
        0.0055,
      );
    },
  );

  it.each(s460)(
    "holds a throat of %d mm in S460 to %d along and %d kN/mm across",
    (throat, along, across) => {
      const weld = { throat, ultimate: 540, correlation: 1 };
      expect(Math.abs(perMm(weld) - along)).toBeLessThan(0.0055);
      expect(Math.abs(perMm({ ...weld, method: "directional", loadAngle: 90 }) - across)).toBeLessThan(
        0.0055,
      );
    },
  );

  // EN 1993-1-8, 4.5.3.3, design shear strength fu/(√3·βw·γM2): S235 360/(√3·0.8·1.25) = 207.8 MPa, from memory.
  it("gives S235 its design shear strength of 207.8 MPa", () => {
    expect(perMm({ throat: 5, ultimate: 360, correlation: 0.8 }) * 200).toBeCloseTo(207.8, 1);
  });
});
