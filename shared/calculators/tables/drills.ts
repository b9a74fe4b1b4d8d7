const INCH = 25.4;

/** A drill that can be bought: its diameter in mm and what the packet says. */
export interface Drill {
  diameter: number;
  name: string;
}

function steps(from: number, to: number, step: number): Drill[] {
  return Array.from({ length: Math.round((to - from) / step) + 1 }, (_, index) => {
    const diameter = Number((from + index * step).toFixed(2));
    return { diameter, name: `${diameter} mm` };
  });
}

/** Metric drills. ISO 235 series, from memory: every 0.05 mm to 3, 0.1 to 14, 0.25 to 32, 0.5 above. */
export const metricDrills: readonly Drill[] = [
  ...steps(1, 2.95, 0.05),
  ...steps(3, 13.9, 0.1),
  ...steps(14, 31.75, 0.25),
  ...steps(32, 40, 0.5),
];

/** Number drills 1 to 60 in ten-thousandths of an inch. ASME B94.11M, from memory. */
const numbers = [
  2280, 2210, 2130, 2090, 2055, 2040, 2010, 1990, 1960, 1935, 1910, 1890, 1850, 1820, 1800, 1770, 1730, 1695,
  1660, 1610, 1590, 1570, 1540, 1520, 1495, 1470, 1440, 1405, 1360, 1285, 1200, 1160, 1130, 1110, 1100, 1065,
  1040, 1015, 995, 980, 960, 935, 890, 860, 820, 810, 785, 760, 730, 700, 670, 635, 595, 550, 520, 465, 430,
  420, 410, 400,
];

/** Letter drills A to Z in thousandths of an inch. ASME B94.11M, from memory. */
const letters = [
  234, 238, 242, 246, 250, 257, 261, 266, 272, 277, 281, 290, 295, 302, 316, 323, 332, 339, 348, 358, 368,
  377, 386, 397, 404, 413,
];

function fraction(sixtyFourths: number): string {
  let [top, bottom] = [sixtyFourths, 64];
  while (top % 2 === 0 && bottom > 1) [top, bottom] = [top / 2, bottom / 2];
  return bottom === 1 ? `${top} in` : `${top}/${bottom} in`;
}

/** Inch drills: numbers, letters, and fractions by 64ths to 1 in. */
export const inchDrills: readonly Drill[] = [
  ...numbers.map((size, index) => ({ diameter: (size * INCH) / 10_000, name: `No. ${index + 1}` })),
  ...letters.map((size, index) => ({
    diameter: (size * INCH) / 1000,
    name: `letter ${String.fromCharCode(65 + index)}`,
  })),
  ...Array.from({ length: 64 }, (_, index) => ({
    diameter: ((index + 1) * INCH) / 64,
    name: fraction(index + 1),
  })),
];

/** The drill nearest in diameter, mm. */
export function nearestDrill(drills: readonly Drill[], diameter: number): Drill {
  return drills.reduce((best, drill) =>
    Math.abs(drill.diameter - diameter) < Math.abs(best.diameter - diameter) ? drill : best,
  );
}
