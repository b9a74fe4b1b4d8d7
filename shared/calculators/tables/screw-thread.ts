const ROOT3 = Math.sqrt(3);

/** A thread as the formulas need it: outside diameter of the screw and pitch, both in mm. */
export interface ScrewThread {
  diameter: number;
  pitch: number;
}

/**
 * Basic minor diameter of the nut: D1 = D − 5√3/8·P.
 *
 * @returns mm
 * @see ISO 724:1993; ASME B1.1 has the same profile
 */
export function minorDiameter({ diameter, pitch }: ScrewThread): number {
  return diameter - (5 * ROOT3 * pitch) / 8;
}

/**
 * Nominal stress area of a metric screw: π/4·((d2 + d3)/2)², which is π/4·(d − 13√3/24·P)².
 *
 * @returns mm²; ISO 898-1 prints it rounded to three figures
 * @see ISO 898-1:2013, 9.1.6.1, with d2 and d3 from ISO 724
 */
export function metricStressArea({ diameter, pitch }: ScrewThread): number {
  return (Math.PI / 4) * (diameter - (13 * ROOT3 * pitch) / 24) ** 2;
}

/**
 * Tensile stress area of a unified screw: π/4·(D − 9√3/16·P)², printed in tables as 0.7854·(D − 0.9743/n)².
 *
 * @returns mm²
 * @see ASME B1.1-2003, appendix B
 */
export function unifiedStressArea({ diameter, pitch }: ScrewThread): number {
  return (Math.PI / 4) * (diameter - (9 * ROOT3 * pitch) / 16) ** 2;
}
