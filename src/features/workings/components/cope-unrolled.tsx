import { distanceFromAxis, joint, type SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import { type LengthUnits, toInches } from "#shared/units/length.ts";
import { linePath, type Spot } from "./drawing-parts.tsx";

const left = 78;
const right = 24;
const top = 46;
const width = 640;

interface UnrolledProps {
  inputs: SaddleCopeInputs;
  results: SaddleCopeResults;
  units: LengthUnits;
  show: (millimetres: number) => string;
}

const quarters = [
  [0, "heel"],
  [90, "90°"],
  [180, "toe"],
  [270, "270°"],
  [360, "heel"],
] as const;

/** The branch's end rolled out flat: solid is the outside line, dashed the bore, both from the squared end. */
export function CopeUnrolled({ inputs, results, units, show }: UnrolledProps) {
  const span = width - left - right;
  const trueHeight = (span * results.deepest) / results.templateWidth;
  const tall = Math.min(300, Math.max(110, trueHeight));
  const height = top + tall + 62;
  const at = (around: number, depth: number): Spot => [
    left + (span * around) / 360,
    top + (tall * depth) / (results.deepest || 1),
  ];
  const tube = joint(inputs);
  const line = (radius: number) =>
    linePath(
      Array.from({ length: 181 }, (_, step) =>
        at(step * 2, distanceFromAxis(tube, radius, step * 2) - results.tipFromAxis),
      ),
    );
  const depths = [
    results.heelDepth,
    results.sideDepth.at90,
    results.toeDepth,
    results.sideDepth.at270,
    results.heelDepth,
  ];
  const words = `The cut unrolled, depth from the squared end: heel ${show(depths[0] ?? 0)}, 90° side ${show(depths[1] ?? 0)}, toe ${show(depths[2] ?? 0)}, 270° side ${show(depths[3] ?? 0)}; deepest ${show(results.deepest)} at ${results.deepestAround.toFixed(0)}°.`;
  return (
    <svg
      viewBox={`0 0 ${width} ${height.toFixed(0)}`}
      role="img"
      aria-label={words}
      className="text-[26px] @lg:text-[17px]"
    >
      {depthTicks(results.deepest, units).map(({ depth, label }) => (
        <g key={label}>
          <path className="line-dimension opacity-40" d={linePath([at(0, depth), at(360, depth)])} />
          <text
            className="drawing-figure fill-chalk-soft"
            x={left - 10}
            y={at(0, depth)[1] + 6}
            textAnchor="end"
          >
            {label}
          </text>
        </g>
      ))}
      <text className="drawing-figure fill-chalk-soft" x={left - 10} y={top - 20} textAnchor="end">
        {units === "mm" ? "mm" : "in"}
      </text>
      {quarters.map(([around, name], index) => (
        <g key={around}>
          <path className="line-centre" d={linePath([at(around, 0), [at(around, 0)[0], top + tall + 14]])} />
          <text className="drawing-figure" x={at(around, 0)[0]} y={height - 22} textAnchor={anchorOf(index)}>
            {name}
          </text>
          <text
            className="drawing-figure fill-chalk-soft"
            x={at(around, 0)[0]}
            y={top - 14}
            textAnchor={anchorOf(index)}
          >
            {index === 4 ? "" : show(depths[index] ?? 0)}
          </text>
        </g>
      ))}
      <path className="line-outline opacity-60" d={linePath([at(0, 0), at(360, 0)])} strokeDasharray="3 3" />
      <path className="line-hidden" d={line(tube.bore)} />
      <path className="line-outline" d={line(tube.r)} />
    </svg>
  );
}

function anchorOf(index: number): "start" | "middle" | "end" {
  return index === 0 ? "start" : index === 4 ? "end" : "middle";
}

/** Three to five round depths, in the person's own unit. */
function depthTicks(deepest: number, units: LengthUnits): { depth: number; label: string }[] {
  const whole = units === "mm" ? deepest : toInches(deepest);
  const rough = whole / 4 || 1;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= rough) ?? 10) * power;
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  return Array.from({ length: Math.floor(whole / step + 1e-9) + 1 }, (_, index) => ({
    depth: (index * step * deepest) / (whole || 1),
    label: (index * step).toFixed(decimals),
  }));
}
