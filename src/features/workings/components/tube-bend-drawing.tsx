import type { TubeBendResults } from "#shared/calculators/tube-bend/formula.ts";
import type { TubeBendInputs } from "#shared/calculators/tube-bend/inputs.ts";
import { type BentPath, bentPath, onArc } from "#shared/calculators/tube-bend/path.ts";
import type { Vector } from "#shared/calculators/vectors.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { stepsBetween } from "./chart-scale.ts";
import { Figure, linePath, type Spot } from "./drawing-parts.tsx";
import { DrawingSheet, fitted } from "./drawing-sheet.tsx";
import { placedWords } from "./placed-words.ts";

const size = { width: 360, height: 340 };

/** More bends than this carry their numbers only. */
const named = 8;

/** The centreline in isometric projection, its bends numbered in the order they are made. */
export function TubeBendDrawing({ inputs, results, units }: DrawingProps<TubeBendInputs, TubeBendResults>) {
  const path = bentPath(inputs);
  if (!path.ok) return null;
  const { bends } = path.value;
  const line = centreline(inputs, path.value).map(isometric);
  const { at } = fitted(line, { left: 50, top: 56, width: 260, height: 214 });
  const spots = line.map(([x, y]) => at(x, y));
  const place = (point: Vector) => at(...isometric(point));
  const words = [
    ...bends.map((bend, index) => ({
      at: place(onArc(bend, 0.5)),
      out: outward(place(bend.start), place(bend.end), place(onArc(bend, 0.5))),
      text: bends.length <= named ? `${index + 1}: ${bend.angle.toFixed(1)}°` : `${index + 1}`,
      soft: false,
    })),
    { at: spots[0] ?? at(0, 0), out: [0, -1] as const, text: "first end", soft: true },
  ];
  const unit = units === "mm" ? "mm" : "in";
  const angles = results.bends.map((angle, index) => `bend ${index + 1} ${angle.toFixed(1)}°`).join(", ");
  return (
    <div className="plate-drawing">
      <div className="mx-auto max-w-md">
        <DrawingSheet
          {...size}
          title="The bent tube"
          description={`Centreline of ${lengthFigure(results.developedLength, units, 1)} ${unit}: ${angles}.`}
        >
          <path className="line-centre" d={linePath(inputs.points.map(place))} />
          <path className="line-outline" d={linePath(spots)} />
          {bends
            .flatMap(({ start, end }) => [start, end])
            .map((point) => (
              <Tick key={point.join(" ")} spot={place(point)} />
            ))}
          {placedWords(words, [...spots, ...spots.toReversed()], size).map(({ at: spot, text, soft }) => (
            <Figure key={text} at={spot} anchor="middle" soft={soft}>
              {text}
            </Figure>
          ))}
          <Figure at={[8, 20]}>{`cut ${lengthFigure(results.cutLength, units, 1)} ${unit}`}</Figure>
          <Figure at={[size.width / 2, size.height - 8]} anchor="middle" soft>
            isometric: x right, y left, z up
          </Figure>
        </DrawingSheet>
      </div>
    </div>
  );
}

/** Places along the centreline, its bends as runs of short lines; mm. */
function centreline({ points }: TubeBendInputs, { bends }: BentPath): Vector[] {
  const ends = [points[0], points.at(-1)].filter((point) => point !== undefined);
  const arcs = bends.flatMap((bend) =>
    stepsBetween(0, 1, Math.max(2, Math.ceil(bend.angle / 5))).map((part) => onArc(bend, part)),
  );
  return [...ends.slice(0, 1), ...arcs, ...ends.slice(1)];
}

/** z upward, x to the right and back, y to the left and back, each at one scale. */
function isometric([x, y, z]: Vector): Spot {
  return [(x - y) * Math.cos(Math.PI / 6), z + (x + y) / 2];
}

/** Unit direction from the bend away from its two ends, y upward; square to the line where it is seen edge-on. */
function outward(start: Spot, end: Spot, [x, y]: Spot): Spot {
  const [dx, dy] = [x - (start[0] + end[0]) / 2, (start[1] + end[1]) / 2 - y];
  const [along, up] = [end[0] - start[0], start[1] - end[1]];
  const chord = Math.hypot(along, up) || 1;
  const away = Math.hypot(dx, dy);
  return away < 0.05 * chord ? [up / chord, -along / chord] : [dx / away, dy / away];
}

/** Where a bend begins or ends. */
function Tick({ spot: [x, y] }: { spot: Spot }) {
  return <circle cx={x.toFixed(2)} cy={y.toFixed(2)} r="3" className="fill-chalk-soft" />;
}
