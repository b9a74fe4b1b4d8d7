import type { ClearanceHoles } from "./unified-threads.ts";

/**
 * Clearance holes for metric screws in mm: fine, medium and coarse series.
 *
 * @see ISO 273:1979; above M16 from memory
 */
const holes: Readonly<Record<number, readonly [fine: number, medium: number, coarse: number]>> = {
  1.6: [1.7, 1.8, 2],
  2: [2.2, 2.4, 2.6],
  2.5: [2.7, 2.9, 3.1],
  3: [3.2, 3.4, 3.6],
  3.5: [3.7, 3.9, 4.2],
  4: [4.3, 4.5, 4.8],
  5: [5.3, 5.5, 5.8],
  6: [6.4, 6.6, 7],
  8: [8.4, 9, 10],
  10: [10.5, 11, 12],
  12: [13, 13.5, 14.5],
  14: [15, 15.5, 16.5],
  16: [17, 17.5, 18.5],
  18: [19, 20, 21],
  20: [21, 22, 24],
  22: [23, 24, 26],
  24: [25, 26, 28],
  27: [28, 30, 32],
  30: [31, 33, 35],
  36: [37, 39, 42],
};

/**
 * Clearance holes for a metric screw.
 *
 * @param diameter of the screw, mm, one of ISO 261
 * @returns mm; throws for a diameter that the table lacks, which a test keeps from happening
 */
export function metricClearance(diameter: number): ClearanceHoles {
  const row = holes[diameter];
  if (!row) throw new Error(`No clearance hole for M${diameter}`);
  const [close, medium, free] = row;
  return { close, medium, free };
}
