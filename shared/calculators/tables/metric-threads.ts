import type { ScrewThread } from "./screw-thread.ts";

/** An ISO metric thread; `tappingDrill` in mm. */
export interface MetricThread extends ScrewThread {
  coarse: boolean;
  tappingDrill: number;
}

/**
 * Diameter, pitch and tapping drill in mm, the coarse pitch of each diameter first.
 *
 * Diameters and pitches: ISO 261. Tapping drills: ISO 2306, from memory, compared in our tests with a printed table.
 */
const rows: readonly (readonly [diameter: number, pitch: number, tappingDrill: number])[] = [
  [1.6, 0.35, 1.25],
  [2, 0.4, 1.6],
  [2.5, 0.45, 2.05],
  [3, 0.5, 2.5],
  [3, 0.35, 2.65],
  [3.5, 0.6, 2.9],
  [4, 0.7, 3.3],
  [4, 0.5, 3.5],
  [5, 0.8, 4.2],
  [5, 0.5, 4.5],
  [6, 1, 5],
  [6, 0.75, 5.2],
  [8, 1.25, 6.8],
  [8, 1, 7],
  [8, 0.75, 7.2],
  [10, 1.5, 8.5],
  [10, 1.25, 8.8],
  [10, 1, 9],
  [10, 0.75, 9.2],
  [12, 1.75, 10.2],
  [12, 1.5, 10.5],
  [12, 1.25, 10.8],
  [12, 1, 11],
  [14, 2, 12],
  [14, 1.5, 12.5],
  [14, 1.25, 12.8],
  [14, 1, 13],
  [16, 2, 14],
  [16, 1.5, 14.5],
  [16, 1, 15],
  [18, 2.5, 15.5],
  [18, 2, 16],
  [18, 1.5, 16.5],
  [18, 1, 17],
  [20, 2.5, 17.5],
  [20, 2, 18],
  [20, 1.5, 18.5],
  [20, 1, 19],
  [22, 2.5, 19.5],
  [22, 2, 20],
  [22, 1.5, 20.5],
  [22, 1, 21],
  [24, 3, 21],
  [24, 2, 22],
  [24, 1.5, 22.5],
  [24, 1, 23],
  [27, 3, 24],
  [27, 2, 25],
  [27, 1.5, 25.5],
  [30, 3.5, 26.5],
  [30, 2, 28],
  [30, 1.5, 28.5],
  [36, 4, 32],
  [36, 3, 33],
  [36, 2, 34],
];

/** ISO metric threads from M1.6 to M36. */
export const metricThreads: readonly MetricThread[] = rows.map(([diameter, pitch, tappingDrill], index) => ({
  diameter,
  pitch,
  tappingDrill,
  coarse: rows[index - 1]?.[0] !== diameter,
}));

/** "M10" for the coarse pitch, "M10x1.25" for a fine one, as ISO 965-1 writes them. */
export function metricDesignation({ diameter, pitch, coarse }: MetricThread): string {
  return coarse ? `M${diameter}` : `M${diameter}x${pitch}`;
}
