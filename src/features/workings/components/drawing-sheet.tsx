import type { ReactNode } from "react";
import { linePath, type Spot } from "./drawing-parts.tsx";

interface DrawingSheetProps {
  width: number;
  height: number;
  title: string;
  /** What the drawing shows, with its numbers, for those who do not see it. */
  description: string;
  /** Sizes of the letters where the usual one, in the drawing's units, will not do. */
  className?: string;
  children: ReactNode;
}

/** One drawing with its name and its words; letters of 15 units unless the class says otherwise. */
export function DrawingSheet({ width, height, title, description, className, children }: DrawingSheetProps) {
  return (
    <svg
      viewBox={`0 0 ${width} ${Math.round(height)}`}
      role="img"
      {...(className ? { className } : { fontSize: 15 })}
    >
      <title>{title}</title>
      <desc>{description}</desc>
      {children}
    </svg>
  );
}

/** Two drawings side by side where there is room, one over the other on a phone. */
export function DrawingPair({
  left,
  right,
  below,
}: {
  left: ReactNode;
  right: ReactNode;
  below?: ReactNode;
}) {
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] @lg:grid-cols-2">
      <div className="plate-drawing mb-0! @lg:mr-0! @lg:mb-3!">{left}</div>
      <div className="plate-drawing">{right}</div>
      {below ? <div className="plate-drawing mt-0! @lg:col-span-2">{below}</div> : null}
    </div>
  );
}

/** The part of a sheet that a shape is to fill. */
export interface Room {
  left: number;
  top: number;
  width: number;
  height: number;
}

/**
 * Puts a shape in mm, y upward, in the middle of a room at one scale.
 *
 * @param spots enough places of the shape to tell how far it reaches
 */
export function fitted(spots: readonly Spot[], room: Room, most = Number.POSITIVE_INFINITY) {
  const xs = spots.map(([x]) => x);
  const ys = spots.map(([, y]) => y);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const [low, high] = [Math.min(...ys), Math.max(...ys)];
  const scale = Math.min(
    most,
    room.width / Math.max(right - left, 1e-9),
    room.height / Math.max(high - low, 1e-9),
  );
  const x0 = room.left + (room.width - scale * (right - left)) / 2;
  const y0 = room.top + (room.height - scale * (high - low)) / 2;
  return { scale, at: (x: number, y: number): Spot => [x0 + (x - left) * scale, y0 + (high - y) * scale] };
}

/** A part of a circle as a run of places; degrees counter-clockwise from the right, in the drawing's units. */
export function arcSpots([x, y]: Spot, radius: number, from: number, to: number): Spot[] {
  const steps = Math.max(2, Math.ceil(Math.abs(to - from) / 4));
  return Array.from({ length: steps + 1 }, (_, step): Spot => {
    const radians = ((from + ((to - from) * step) / steps) * Math.PI) / 180;
    return [x + radius * Math.cos(radians), y - radius * Math.sin(radians)];
  });
}

/** Section lines at 45° over a shape given as a path; `id` tells one pattern of a page from another. */
export function Hatched({ id, d }: { id: string; d: string }) {
  return (
    <>
      <defs>
        <pattern id={id} width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0V7" className="line-dimension" />
        </pattern>
      </defs>
      <path d={d} fill={`url(#${id})`} fillRule="evenodd" />
      <path d={d} className="line-outline" />
    </>
  );
}

/** A tube or plate that goes on: one lazy S between its two sides, `bow` of their distance deep. */
export function breakLine([x1, y1]: Spot, [x2, y2]: Spot, bow = 0.09): string {
  const [dx, dy] = [(y2 - y1) * bow, (x1 - x2) * bow];
  const spots = Array.from({ length: 17 }, (_, step): Spot => {
    const share = step / 16;
    const side = Math.sin(2 * Math.PI * share);
    return [x1 + (x2 - x1) * share + dx * side, y1 + (y2 - y1) * share + dy * side];
  });
  return linePath(spots);
}

/** A number with a narrow space at the thousands; past seven figures as tens to a power of three. */
export function grouped(value: number, decimals = 0): string {
  if (Math.abs(value) >= 1e7) {
    const power = Math.floor(Math.log10(Math.abs(value)) / 3) * 3;
    const signs = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    const raised = [...String(power)].map((figure) => signs[Number(figure)]).join("");
    return `${(value / 10 ** power).toPrecision(4)}×10${raised}`;
  }
  const [whole = "", part] = value.toFixed(decimals).split(".");
  const spaced = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, "\u2009") : whole;
  return part ? `${spaced}.${part}` : spaced;
}
