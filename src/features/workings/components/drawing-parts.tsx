/** A place in a drawing's own units, y downward. */
export type Spot = readonly [x: number, y: number];

export function linePath(spots: readonly Spot[]): string {
  return spots.map(([x, y], index) => `${index === 0 ? "M" : "L"}${x.toFixed(2)} ${y.toFixed(2)}`).join("");
}

/** One straight line. */
export function stroke(x1: number, y1: number, x2: number, y2: number): string {
  return linePath([
    [x1, y1],
    [x2, y2],
  ]);
}

function along([x1, y1]: Spot, [x2, y2]: Spot) {
  const length = Math.hypot(x2 - x1, y2 - y1) || 1;
  return { length, ux: (x2 - x1) / length, uy: (y2 - y1) / length };
}

/** A filled arrowhead with its point at the place, as ISO 129-1 draws them. */
function arrowHead([x, y]: Spot, ux: number, uy: number): string {
  const [back, half] = [8, 2.4];
  const [bx, by] = [x - ux * back, y - uy * back];
  return `${linePath([
    [x, y],
    [bx - uy * half, by + ux * half],
    [bx + uy * half, by - ux * half],
  ])}Z`;
}

type DimensionProps = { from: Spot; to: Spot; text: string; at?: Spot; anchor?: "start" | "middle" | "end" };

/** A dimension line with arrowheads at both ends: turned inward when there is no room between them. */
export function Dimension({ from, to, text, at, anchor = "middle" }: DimensionProps) {
  const { length, ux, uy } = along(from, to);
  const tight = length < 22;
  const reach = tight ? 16 : 0;
  const start: Spot = [from[0] - ux * reach, from[1] - uy * reach];
  const end: Spot = [to[0] + ux * reach, to[1] + uy * reach];
  const turn = tight ? -1 : 1;
  const [x, y] = at ?? [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2 - 5];
  return (
    <>
      <path className="line-dimension" d={linePath([start, end])} />
      <path
        d={`${arrowHead(from, -ux * turn, -uy * turn)}${arrowHead(to, ux * turn, uy * turn)}`}
        className="fill-chalk-soft"
      />
      <Figure at={[x, y]} anchor={anchor}>
        {text}
      </Figure>
    </>
  );
}

type FigureProps = { at: Spot; anchor?: "start" | "middle" | "end"; soft?: boolean; children: string };

/** Words in a drawing, with a seam of plate round them so that a line behind does not cross them out. */
export function Figure({ at: [x, y], anchor = "start", soft = false, children }: FigureProps) {
  return (
    <text
      x={x.toFixed(1)}
      y={y.toFixed(1)}
      textAnchor={anchor}
      className={soft ? "drawing-figure fill-chalk-soft" : "drawing-figure"}
      stroke="var(--color-plate)"
      strokeWidth="5"
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      {children}
    </text>
  );
}
