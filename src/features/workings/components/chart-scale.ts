/**
 * Round values for an axis, from 0 to the last that does not pass `most`.
 *
 * @param parts how many divisions to aim at; there are between about half and one and a half times as many
 */
export function niceTicks(most: number, parts = 5): { value: number; label: string }[] {
  const rough = most / parts;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= rough * 0.999) ?? 10) * power;
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  return Array.from({ length: Math.floor(most / step + 1e-9) + 1 }, (_, index) => ({
    value: index * step,
    label: (index * step).toFixed(decimals),
  }));
}

/** Even steps from one value to another, both ends with them. */
export function stepsBetween(from: number, to: number, count: number): number[] {
  return Array.from({ length: count + 1 }, (_, index) => from + ((to - from) * index) / count);
}

export interface CurvePoint {
  x: number;
  y: number;
}

/**
 * A curve cut off where it leaves a chart over its top: the crossing is put in, straight between the neighbours.
 *
 * @returns runs of points that lie within; none where the whole curve is above
 */
export function clippedBelow(points: readonly CurvePoint[], top: number): CurvePoint[][] {
  const runs: CurvePoint[][] = [];
  let run: CurvePoint[] = [];
  for (const [index, point] of points.entries()) {
    const before = points[index - 1];
    if (before && before.y > top !== point.y > top) {
      const share = (top - before.y) / (point.y - before.y);
      run.push({ x: before.x + (point.x - before.x) * share, y: top });
    }
    if (point.y <= top) run.push(point);
    else if (run.length > 0) {
      runs.push(run);
      run = [];
    }
  }
  if (run.length > 0) runs.push(run);
  return runs;
}

/** Round values for an axis that does not begin at 0: every one from `low` to `high`. */
export function ticksBetween(low: number, high: number, parts = 4): { value: number; label: string }[] {
  const [zero, first] = niceTicks(high - low, parts);
  const step = (first?.value ?? 0) - (zero?.value ?? 0);
  if (!(step > 0)) return [];
  const decimals = (first?.label.split(".")[1] ?? "").length;
  const from = Math.ceil(low / step - 1e-9);
  const count = Math.floor(high / step + 1e-9) - from + 1;
  return Array.from({ length: Math.max(0, count) }, (_, index) => {
    const value = (from + index) * step + 0;
    return { value, label: value.toFixed(decimals).replace("-", "−") };
  });
}
