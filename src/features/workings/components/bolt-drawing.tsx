import { useId } from "react";
import type { BoltResults } from "#shared/calculators/bolt/formula.ts";
import type { BoltInputs } from "#shared/calculators/bolt/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, DrawingPair, DrawingSheet, grouped, Hatched } from "./drawing-sheet.tsx";

const size = { width: 360, height: 330 };

/** The bolt in its joint, and its four loads against each other. */
export function BoltDrawing({ inputs, results, units }: DrawingProps<BoltInputs, BoltResults>) {
  const show = (length: number) => lengthFigure(length, units, 2);
  return (
    <DrawingPair
      left={<BoltInJoint inputs={inputs} results={results} show={show} />}
      right={<BoltLoads inputs={inputs} results={results} />}
    />
  );
}

interface BoltInJointProps {
  inputs: BoltInputs;
  results: BoltResults;
  show: (millimetres: number) => string;
}

/** One bolt diameter on the sheet; head and nut are in the usual proportions to it, not a standard's. */
const d = 56;

/** The bolt lying, head on the left, its thread as ISO 6410-1 draws one: thick crests, thin roots. */
function BoltInJoint({ inputs, results, show }: BoltInJointProps) {
  const [left, y] = [54, 118];
  const head = 0.65 * d;
  const grip = 2 * d;
  const start = left + head;
  const nut = start + grip;
  const end = nut + 0.85 * d + 14;
  const root = (d / 2) * (1 - (1.0825 * results.pitch) / results.diameter);
  const plane = start + grip / 2;
  const thread = inputs.threadsInShear ? start + 0.4 * d : start + 1.3 * d;
  const bolt = [
    [start, y - d / 2],
    [end - 5, y - d / 2],
    [end, y - root],
    [end, y + root],
    [end - 5, y + d / 2],
    [start, y + d / 2],
  ] as const;
  return (
    <DrawingSheet
      {...size}
      title="The bolt in its joint"
      description={`${inputs.size} by ${results.pitch}, grade ${inputs.grade}. Stress area ${results.stressArea.toFixed(1)} square millimetres. ${inputs.threadsInShear ? "The thread" : "The plain shank"} lies in the shear plane.`}
    >
      <path className="line-centre" d={stroke(left - 14, y, end + 14, y)} />
      <path className="line-outline" d={linePath(bolt)} />
      <path
        className="line-dimension"
        d={stroke(thread, y - root, end, y - root) + stroke(thread, y + root, end, y + root)}
      />
      <path className="line-outline" d={stroke(thread, y - d / 2, thread, y + d / 2)} />
      <path className="line-outline" d={hexagon(left, head, y) + hexagon(nut, 0.85 * d, y)} />
      <path className="line-outline" d={plate(start, plane, y) + plate(plane, nut, y)} />
      <ShearPlane x={plane} y={y} />
      <path
        className="line-dimension"
        d={linePath([
          [plane, y + 76],
          [plane, 222],
          [plane + 14, 222],
        ])}
      />
      <Figure at={[plane + 18, 227]}>{inputs.threadsInShear ? "thread in shear" : "shank in shear"}</Figure>
      <Figure at={[4, 22]}>{`${inputs.size} × ${results.pitch}, grade ${inputs.grade}`}</Figure>
      <StressArea results={results} show={show} />
    </DrawingSheet>
  );
}

/** Side view across corners: three faces. */
function hexagon(x: number, thick: number, y: number): string {
  const half = 0.92 * d;
  const rows = [-half, -half / 2, half / 2, half].map((up) => stroke(x, y + up, x + thick, y + up));
  return rows.join("") + [x, x + thick].map((at) => stroke(at, y - half, at, y + half)).join("");
}

/** A clamped plate above and below the bolt. */
function plate(from: number, to: number, y: number): string {
  const [near, far] = [0.56 * d, 1.25 * d];
  return [-1, 1]
    .map((way) =>
      linePath([
        [from, y + way * far],
        [from, y + way * near],
        [to, y + way * near],
        [to, y + way * far],
      ]),
    )
    .join("");
}

/** Where the plates slide: a dashed line, and the two pulls. */
function ShearPlane({ x, y }: { x: number; y: number }) {
  const arrow = (at: number, from: number, to: number) => {
    const way = Math.sign(to - from);
    return `${stroke(at, from, at, to)}${linePath([
      [at - 4, to - way * 8],
      [at, to],
      [at + 4, to - way * 8],
    ])}`;
  };
  return (
    <g stroke="var(--color-straw)" fill="none" strokeWidth="2">
      <path d={stroke(x, y - 76, x, y + 76)} strokeDasharray="7 4" />
      <path d={arrow(x - 12, y + 66, y + 40) + arrow(x + 12, y - 66, y - 40)} />
    </g>
  );
}

/** The circle that the stress is reckoned on, inside the outside diameter. */
function StressArea({ results, show }: { results: BoltResults; show: (length: number) => string }) {
  const id = useId();
  const centre: Spot = [54, 278];
  const across = Math.sqrt((4 * results.stressArea) / Math.PI);
  const outside = 40;
  return (
    <>
      <path className="line-dimension" d={linePath(arcSpots(centre, outside, 0, 360))} />
      <Hatched id={id} d={`${linePath(arcSpots(centre, (outside * across) / results.diameter, 0, 360))}Z`} />
      <path className="line-dimension" d={stroke(centre[0] + 20, 268, 116, 268)} />
      <Figure at={[120, 273]}>{`stress area ${results.stressArea.toFixed(1)} mm²`}</Figure>
      <Figure at={[120, 295]} soft>
        {`as a circle ⌀ ${show(across)}`}
      </Figure>
    </>
  );
}

/** Loads as bars from one zero, so that the eye compares them. */
function BoltLoads({ inputs, results }: { inputs: BoltInputs; results: BoltResults }) {
  const bars = [
    ["proof load", results.proofLoad],
    [`preload, ${Math.round(inputs.preloadFraction * 100)} % of proof`, results.preload],
    ["tension resistance", results.tensionResistance],
    ["shear resistance", results.shearResistance],
  ] as const;
  const most = Math.max(...bars.map(([, load]) => load));
  const long = 344;
  return (
    <DrawingSheet
      {...size}
      title="The bolt's resistances and preload"
      description={`${bars.map(([name, load]) => `${name} ${(load / 1000).toFixed(1)} kilonewtons`).join(", ")}. Torque ${results.torque.toFixed(1)} newton metres.`}
    >
      {bars.map(([name, load], index) => {
        const y = 22 + index * 64;
        return (
          <g key={name}>
            <Figure at={[8, y]} soft={index > 1}>
              {name}
            </Figure>
            <Figure at={[352, y]} anchor="end">{`${grouped(load / 1000, 1)} kN`}</Figure>
            <rect
              className={index === 1 ? "line-outline" : "line-dimension"}
              style={{ fill: index === 1 ? "var(--color-straw)" : "var(--color-plate-line)" }}
              x="8"
              y={y + 8}
              width={((long * load) / most).toFixed(2)}
              height="20"
            />
          </g>
        );
      })}
      <path className="line-dimension" d={stroke(8, 24, 8, 250)} />
      <Figure at={[8, 292]}>{`Tighten to ${results.torque.toFixed(1)} N·m`}</Figure>
      <Figure at={[8, 314]} soft>
        {`K ${inputs.frictionFactor}: a third more or less`}
      </Figure>
    </DrawingSheet>
  );
}
