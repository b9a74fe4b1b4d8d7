import { Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";

/** Least distance of one line of words from the next, in the drawing's units. */
const rowHeight = 38;
const words = 262;

interface JigHeightWordsProps {
  /** From mm to the sheet. */
  at: (x: number, y: number) => Spot;
  /** Height of the table's top, and how far right the drawing reaches; mm. */
  table: number;
  right: number;
  points: readonly { name: string; spot: Spot }[];
  show: (millimetres: number) => string;
}

/** The jig table as a line, and the height above it of each point that is packed up. */
export function JigHeightWords({ at, table, right, points, show }: JigHeightWordsProps) {
  const top = at(right, table)[1];
  const rows = [...points, { name: "table", spot: [right, table] as const }];
  const placed = spreadOut(rows.map(({ spot }) => at(...spot)[1]));
  return (
    <>
      <path className="line-outline" d={stroke(8, top, words - 14, top)} />
      {rows.map(({ name, spot }, index) => {
        const from = at(...spot);
        const y = placed[index] ?? from[1];
        return (
          <g key={name}>
            <path
              className="line-dimension"
              d={linePath([from, [words - 14, from[1]], [words - 2, y], [words + 4, y]])}
            />
            <Figure at={[words + 8, y - 2]} soft>
              {name}
            </Figure>
            {spot[1] > table ? <Figure at={[words + 8, y + 14]}>{show(spot[1] - table)}</Figure> : null}
          </g>
        );
      })}
    </>
  );
}

/** Heights on the sheet, lowest number first, pushed up just far enough to keep their words apart. */
function spreadOut(heights: readonly number[]): number[] {
  const order = heights.map((_, index) => index).sort((a, b) => (heights[b] ?? 0) - (heights[a] ?? 0));
  const placed = [...heights];
  let last = 410;
  for (const index of order) {
    last = Math.min(placed[index] ?? 0, last - rowHeight);
    placed[index] = last;
  }
  return placed;
}
