import { useId } from "react";
import type { TubeSectionResults } from "#shared/calculators/tube-section/formula.ts";
import type { TubeSectionInputs } from "#shared/calculators/tube-section/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, DrawingPair, DrawingSheet, grouped, Hatched } from "./drawing-sheet.tsx";

const size = { width: 360, height: 340 };
const centre: Spot = [158, 164];

/** The section to scale with its axes, and what it is worth about each. */
export function TubeSectionDrawing({
  inputs,
  results,
  units,
}: DrawingProps<TubeSectionInputs, TubeSectionResults>) {
  const show = (length: number) => lengthFigure(length, units, 1);
  const parts = { inputs, results, show };
  return (
    <DrawingPair left={<Section {...parts} />} right={<Worth results={results} upright={isTall(inputs)} />} />
  );
}

const isTall = ({ shape, width = 0, height = 0 }: TubeSectionInputs) =>
  shape !== "rectangle" || height >= width;

interface SectionProps {
  inputs: TubeSectionInputs;
  results: TubeSectionResults;
  show: (millimetres: number) => string;
}

function Section({ inputs, results, show }: SectionProps) {
  const id = useId();
  const round = inputs.shape === "round";
  const width = (round ? inputs.od : inputs.shape === "square" ? inputs.side : inputs.width) ?? 0;
  const height = (inputs.shape === "rectangle" ? inputs.height : width) ?? 0;
  const scale = Math.min(200 / width, 200 / height);
  const [halfWidth, halfHeight] = [(width * scale) / 2, (height * scale) / 2];
  const [x, y] = centre;
  const wall = inputs.wall * scale;
  const outline = round ? ring(halfWidth) : box(halfWidth, halfHeight, results.outsideRadius * scale);
  const bore = round
    ? ring(halfWidth - wall)
    : box(halfWidth - wall, halfHeight - wall, results.insideRadius * scale);
  return (
    <DrawingSheet
      {...size}
      title="The section"
      description={`${inputs.shape} tube, ${show(width)}${inputs.shape === "rectangle" ? ` by ${show(height)}` : ""}, wall ${show(inputs.wall)}.`}
    >
      <Hatched id={id} d={`${outline}${bore}`} />
      <path
        className="line-centre"
        d={
          stroke(x - halfWidth - 20, y, x + halfWidth + 20, y) +
          stroke(x, y - halfHeight - 20, x, y + halfHeight + 14)
        }
      />
      <Figure at={[x - halfWidth - 26, y + 5]} anchor="end" soft>
        {isTall(inputs) ? "1" : "2"}
      </Figure>
      <Figure at={[x, y - halfHeight - 26]} anchor="middle" soft>
        {isTall(inputs) ? "2" : "1"}
      </Figure>
      <Sides
        half={[halfWidth, halfHeight]}
        straight={round ? 0 : halfHeight - results.outsideRadius * scale}
        across={round ? `⌀ ${show(width)}` : show(width)}
      />
      {inputs.shape === "rectangle" ? (
        <Heights
          half={[halfWidth, halfHeight]}
          straight={halfWidth - results.outsideRadius * scale}
          text={show(height)}
        />
      ) : null}
      <Callouts
        {...{ inputs, results, show }}
        at={[x + (round ? 0 : Math.min(halfWidth * 0.5, 30)), y - halfHeight]}
        wall={wall}
      />
    </DrawingSheet>
  );
}

interface SidesProps {
  half: Spot;
  /** How far the side runs straight from the middle: the witness lines begin there. */
  straight: number;
}

function Sides({ half: [halfWidth, halfHeight], straight, across }: SidesProps & { across: string }) {
  const [x, y] = centre;
  const low = y + halfHeight + 34;
  const witness = (out: number) => stroke(x + out, y + straight + 4, x + out, low + 6);
  return (
    <>
      <path className="line-dimension" d={witness(-halfWidth) + witness(halfWidth)} />
      <Dimension from={[x - halfWidth, low]} to={[x + halfWidth, low]} text={across} at={[x, low + 20]} />
    </>
  );
}

function Heights({ half: [halfWidth, halfHeight], straight, text }: SidesProps & { text: string }) {
  const [x, y] = centre;
  const right = x + halfWidth + 34;
  const witness = (up: number) => stroke(x + straight + 4, y + up, right + 6, y + up);
  return (
    <>
      <path className="line-dimension" d={witness(-halfHeight) + witness(halfHeight)} />
      <Dimension
        from={[right, y - halfHeight]}
        to={[right, y + halfHeight]}
        text={text}
        at={[right + 8, y + 5]}
        anchor="start"
      />
    </>
  );
}

/** Wall and corner radii, on a line led out of the metal. */
function Callouts({ inputs, results, show, at: [x, y], wall }: SectionProps & { at: Spot; wall: number }) {
  const radii = results.outsideRadius > 0;
  const start: Spot = [inputs.shape === "round" ? x + 14 : x, y + wall / 2];
  const elbow: Spot = [204, radii ? 40 : 24];
  return (
    <>
      <path className="line-dimension" d={linePath([start, elbow, [350, elbow[1]]])} />
      <circle className="fill-chalk" cx={start[0].toFixed(2)} cy={start[1].toFixed(2)} r="2.5" />
      <Figure at={[352, elbow[1] - 6]} anchor="end">{`wall ${show(inputs.wall)}`}</Figure>
      {radii ? (
        <Figure at={[352, elbow[1] + 18]} anchor="end" soft>
          {`R ${show(results.outsideRadius)} / ${show(results.insideRadius)}`}
        </Figure>
      ) : null}
    </>
  );
}

function ring(radius: number): string {
  return `${linePath(arcSpots(centre, radius, 0, 360))}Z`;
}

function box(halfWidth: number, halfHeight: number, radius: number): string {
  const [x, y] = centre;
  const [across, down] = [halfWidth - radius, halfHeight - radius];
  const corners = [
    [across, -down, 0],
    [-across, -down, 90],
    [-across, down, 180],
    [across, down, 270],
  ] as const;
  const spots = corners.flatMap(([dx, dy, from]): Spot[] =>
    radius > 0 ? arcSpots([x + dx, y + dy], radius, from, from + 90) : [[x + dx, y + dy]],
  );
  return `${linePath(spots)}Z`;
}

/** The properties, set out by axis. */
function Worth({ results, upright }: { results: TubeSectionResults; upright: boolean }) {
  const same = results.i === results.iMinor;
  const rows = [
    ["area", grouped(results.area, 1), "mm²"],
    ["mass", results.massPerMetre.toFixed(3), "kg/m"],
    [same ? "axis 1–1" : `axis 1–1, ${upright ? "lying" : "upright"}: strong`, "", ""],
    ["I", grouped(results.i), "mm⁴"],
    ["W", grouped(results.w), "mm³"],
    ["Wpl", grouped(results.wpl), "mm³"],
    [same ? "axis 2–2: the same" : `axis 2–2, ${upright ? "upright" : "lying"}`, "", ""],
    ["I", grouped(results.iMinor), "mm⁴"],
    ["W", grouped(results.wMinor), "mm³"],
    ["i", results.radiusOfGyrationMinor.toFixed(2), "mm"],
    ["in twist", "", ""],
    ["It", grouped(results.torsion), "mm⁴"],
  ] as const;
  return (
    <DrawingSheet
      {...size}
      title="What the section is worth"
      description={rows.map((row) => row.join(" ").trim()).join(", ")}
    >
      {rows.map(([name, figure, unit], index) => {
        const y = 30 + index * 26;
        return (
          <g key={`${name}${y}`}>
            {figure ? null : (
              <path className="line-dimension opacity-60" d={stroke(8, y - 20, 352, y - 20)} />
            )}
            <Figure at={[figure ? 24 : 8, y]} soft={figure !== ""}>
              {name}
            </Figure>
            <Figure at={[276, y]} anchor="end">
              {figure}
            </Figure>
            <Figure at={[288, y]} soft>
              {unit}
            </Figure>
          </g>
        );
      })}
    </DrawingSheet>
  );
}
