/**
 * Puts words that stand along a line on as few rows as keep them apart, in their order.
 *
 * @returns the row of each, 0 nearest the line
 */
export function staggered(spans: readonly { from: number; to: number }[]): number[] {
  const ends: number[] = [];
  return spans.map(({ from, to }) => {
    const free = ends.findIndex((end) => end <= from);
    const row = free < 0 ? ends.length : free;
    ends[row] = to;
    return row;
  });
}
