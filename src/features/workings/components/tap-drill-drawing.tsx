import { useId } from "react";
import type { TapDrillResults } from "#shared/calculators/tap-drill/formula.ts";
import type { TapDrillInputs } from "#shared/calculators/tap-drill/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, DrawingPair, DrawingSheet, Hatched } from "./drawing-sheet.tsx";

const size = { width: 360, height: 330 };

interface HoleProps {
  results: TapDrillResults;
  show: (millimetres: number) => string;
}

/** The tapped hole cut through, and every hole of this thread from above. */
export function TapDrillDrawing({ results, units }: DrawingProps<TapDrillInputs, TapDrillResults>) {
  const show = (length: number) => lengthFigure(length, units, 2);
  return (
    <DrawingPair
      left={<TappedHole results={results} show={show} />}
      right={<Holes results={results} show={show} />}
    />
  );
}

/** The hole as it comes out of the drill to use: the flats of its thread lie on the drilled wall. */
function TappedHole({ results, show }: HoleProps) {
  const id = useId();
  const { diameter, pitch, standardDrill } = results;
  const scale = 170 / diameter;
  const middle = size.width / 2;
  const [top, bottom] = [72, 226];
  const [out, drilled] = [(diameter * scale) / 2, (standardDrill * scale) / 2];
  const wall = threadWall(out, drilled, pitch * scale, top, bottom);
  const edge = 156;
  const side = (way: 1 | -1): string =>
    `${linePath([[middle + way * edge, top], ...wall.map(([x, y]): Spot => [middle + way * x, y]), [middle + way * edge, bottom]])}Z`;
  return (
    <DrawingSheet
      {...size}
      title="The tapped hole cut through"
      description={`${results.designation}: drilled ${show(standardDrill)}, outside diameter of the thread ${show(diameter)}, pitch ${show(pitch)}; ${results.standardDrillEngagement.toFixed(0)} percent of a full thread.`}
    >
      <Hatched id={id} d={side(-1) + side(1)} />
      <path className="line-centre" d={stroke(middle, top - 14, middle, bottom + 14)} />
      <path
        className="line-dimension"
        d={
          [-drilled, drilled].map((x) => stroke(middle + x, top, middle + x, top - 24)).join("") +
          [-out, out].map((x) => stroke(middle + x, bottom, middle + x, bottom + 34)).join("")
        }
      />
      <Dimension
        from={[middle - drilled, top - 18]}
        to={[middle + drilled, top - 18]}
        text={`drill ⌀ ${show(standardDrill)}`}
        at={[middle, top - 28]}
      />
      <Dimension
        from={[middle - out, bottom + 28]}
        to={[middle + out, bottom + 28]}
        text={`${results.designation} ⌀ ${show(diameter)}`}
        at={[middle, bottom + 50]}
      />
      <Figure at={[middle, 322]} anchor="middle" soft>
        {`thread ${results.standardDrillEngagement.toFixed(0)} % full, pitch ${show(pitch)}`}
      </Figure>
      <Figure at={[middle, 20]} anchor="middle" soft>
        {results.standardDrillName.endsWith("mm")
          ? "drill to use"
          : `drill to use: ${results.standardDrillName}`}
      </Figure>
    </DrawingSheet>
  );
}

/** Half of the wall: flanks at 30° either way from square to the axis, flat at the outside and where it was drilled. */
function threadWall(out: number, drilled: number, pitch: number, top: number, bottom: number): Spot[] {
  const rise = (out - drilled) * Math.tan(Math.PI / 6);
  const flat = pitch / 8;
  const spots: Spot[] = [[drilled, top]];
  for (let y = top + pitch / 4; y + flat + 2 * rise < bottom; y += pitch) {
    spots.push([drilled, y], [out, y + rise], [out, y + rise + flat], [drilled, y + 2 * rise + flat]);
  }
  return [...spots, [drilled, bottom]];
}

/** Rings from the smallest to the widest, each led to its name. */
function Holes({ results, show }: HoleProps) {
  const rings = [
    ["minor", results.minor],
    ["drill", results.standardDrill],
    ["screw", results.diameter],
    ["close", results.clearance.close],
    ["medium", results.clearance.medium],
    ["free", results.clearance.free],
  ] as const;
  const sorted = rings.toSorted(([, a], [, b]) => b - a);
  const scale = 112 / results.clearance.free;
  const centre: Spot = [118, 172];
  return (
    <DrawingSheet
      {...size}
      title="The holes of this thread"
      description={sorted.map(([name, across]) => `${name} ${show(across)}`).join(", ")}
    >
      <path
        className="line-centre"
        d={stroke(2, centre[1], 234, centre[1]) + stroke(centre[0], 54, centre[0], 290)}
      />
      {sorted.map(([name, across], index) => {
        const radius = across * scale;
        const y = 48 + index * 48;
        const angle = 62 - index * 25;
        const [from] = arcSpots(centre, radius, angle, angle);
        return (
          <g key={name}>
            <path
              className={
                name === "screw" ? "line-outline" : name === "minor" ? "line-hidden" : "line-dimension"
              }
              d={linePath(arcSpots(centre, radius, 0, 360))}
            />
            {from ? (
              <>
                <path className="line-dimension" d={linePath([from, [240, y - 5], [248, y - 5]])} />
                <circle className="fill-chalk" cx={from[0].toFixed(2)} cy={from[1].toFixed(2)} r="2.5" />
              </>
            ) : null}
            <Figure at={[252, y]} soft={name === "minor"}>
              {name}
            </Figure>
            <Figure at={[356, y + (show(across).length > 5 ? 18 : 0)]} anchor="end" soft={name === "minor"}>
              {show(across)}
            </Figure>
          </g>
        );
      })}
      <Figure at={[4, 22]} soft>
        close, medium, free: clear the screw
      </Figure>
    </DrawingSheet>
  );
}
