import type { ScrewThread } from "./screw-thread.ts";

const INCH = 25.4;

/** Clearance holes for one screw, mm. */
export interface ClearanceHoles {
  close: number;
  medium: number;
  free: number;
}

/** A unified inch thread in mm; its designation as ASME B1.1 writes it. */
export interface UnifiedThread extends ScrewThread {
  designation: string;
  clearance: ClearanceHoles;
}

/**
 * Name, diameter in inches, threads per inch coarse (UNC) and fine (UNF), and clearance holes in inches: close,
 * normal, loose.
 *
 * Diameters and threads per inch: ASME B1.1. Clearance holes: ASME B18.2.8, from memory.
 */
const rows: readonly (readonly [
  name: string,
  diameter: number,
  unc: number,
  unf: number,
  close: number,
  normal: number,
  loose: number,
])[] = [
  ["#2", 0.086, 56, 64, 0.094, 0.102, 0.116],
  ["#4", 0.112, 40, 48, 0.12, 0.128, 0.144],
  ["#6", 0.138, 32, 40, 0.154, 0.17, 0.185],
  ["#8", 0.164, 32, 36, 0.18, 0.194, 0.213],
  ["#10", 0.19, 24, 32, 0.206, 0.221, 0.238],
  ["1/4", 0.25, 20, 28, 0.266, 0.281, 0.297],
  ["5/16", 0.3125, 18, 24, 0.328, 0.344, 0.359],
  ["3/8", 0.375, 16, 24, 0.391, 0.406, 0.422],
  ["7/16", 0.4375, 14, 20, 0.453, 0.469, 0.484],
  ["1/2", 0.5, 13, 20, 0.531, 0.562, 0.609],
  ["5/8", 0.625, 11, 18, 0.656, 0.688, 0.734],
  ["3/4", 0.75, 10, 16, 0.781, 0.812, 0.906],
  ["7/8", 0.875, 9, 14, 0.906, 0.938, 1.031],
  ["1", 1, 8, 12, 1.031, 1.094, 1.156],
];

/** UNC and UNF threads from #2 to 1 in. */
export const unifiedThreads: readonly UnifiedThread[] = rows.flatMap(
  ([name, diameter, unc, unf, close, normal, loose]) => {
    const clearance = { close: close * INCH, medium: normal * INCH, free: loose * INCH };
    const thread = (perInch: number, series: string) => ({
      designation: `${name}-${perInch} ${series}`,
      diameter: diameter * INCH,
      pitch: INCH / perInch,
      clearance,
    });
    return [thread(unc, "UNC"), thread(unf, "UNF")];
  },
);
