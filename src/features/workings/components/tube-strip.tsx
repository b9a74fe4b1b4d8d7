import type { StripPoint, TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import type { TubePieceInputs } from "#shared/calculators/tube-piece/inputs.ts";
import { Dimension, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { breakLine, DrawingSheet } from "./drawing-sheet.tsx";

const width = 640;
const [left, right] = [34, 476];
const top = 52;
const gap = 46;

interface TubeStripProps {
  inputs: TubePieceInputs;
  results: TubePieceResults;
  show: (millimetres: number) => string;
}

/** Both cuts on one strip; the plain tube between them is broken out. */
export function TubeStrip({ results, show }: TubeStripProps) {
  const { strip, tipToTip, ends } = results;
  const scale = Math.min(
    (right - left) / strip.width,
    190 / Math.max(ends[0].deepest, ends[1].deepest, 1e-9),
  );
  const deep = [ends[0].deepest * scale, ends[1].deepest * scale] as const;
  const breakA = top + deep[0] + 26;
  const breakB = breakA + gap;
  const bottom = breakB + 26 + deep[1];
  const across = (around: number) => left + ((right - left) * around) / 360;
  const line = (at: (point: StripPoint) => number) =>
    linePath(strip.curve.map((point): Spot => [across(point.around), at(point)]));
  const a = (along: number) => top + along * scale;
  const b = (along: number) => bottom - (tipToTip - along) * scale;
  const heelB = left + ((right - left) * strip.heelB) / strip.width;
  const upright = (x: number) => stroke(x, top, x, breakA) + stroke(x, breakB, x, bottom);
  const rows = [left, right].map((x) => upright(x)).join("");
  return (
    <DrawingSheet
      width={width}
      height={bottom + 48}
      className="text-[26px] @lg:text-[17px]"
      title="The tube rolled out"
      description={`End A is cut ${show(ends[0].deepest)} deep, end B ${show(ends[1].deepest)}. B's heel lies ${show(strip.heelB)} along the wrap from A's; once round is ${show(strip.width)}.`}
    >
      <path className="line-dimension" d={rows} />
      <path className="line-centre" d={[90, 180, 270].map((around) => upright(across(around))).join("")} />
      <path
        className="line-dimension"
        d={[breakA, breakB].map((y) => breakLine([left, y], [right, y], 0.02)).join("")}
      />
      <path
        className="line-outline opacity-60"
        strokeDasharray="3 3"
        d={stroke(left, top, right, top) + stroke(left, bottom, right, bottom)}
      />
      <path className="line-hidden" d={line((point) => a(point.innerA)) + line((point) => b(point.innerB))} />
      <path className="line-outline" d={line((point) => a(point.a)) + line((point) => b(point.b))} />
      <path
        className="line-dimension"
        style={{ stroke: "var(--color-straw)" }}
        d={stroke(left, top - 8, left, breakA) + stroke(heelB, breakB, heelB, bottom + 8)}
      />
      <text className="drawing-figure" x={left} y={top - 18}>
        A's heel: datum
      </text>
      <text
        className="drawing-figure"
        x={Math.min(right, Math.max(left + 50, heelB))}
        y={bottom + 36}
        textAnchor="middle"
      >
        B's heel
      </text>
      <DepthOf name="A" from={top} to={top + deep[0]} text={show(ends[0].deepest)} />
      <DepthOf name="B" from={bottom - deep[1]} to={bottom} text={show(ends[1].deepest)} />
    </DrawingSheet>
  );
}

/** How deep one end is cut, beside the strip. */
function DepthOf({ name, from, to, text }: { name: string; from: number; to: number; text: string }) {
  const x = right + 26;
  if (to - from < 1) return null;
  return (
    <>
      <path
        className="line-dimension"
        d={stroke(right + 4, from, x + 6, from) + stroke(right + 4, to, x + 6, to)}
      />
      <Dimension
        from={[x, from]}
        to={[x, to]}
        text={`${name} ${text}`}
        at={[x + 12, (from + to) / 2 + 6]}
        anchor="start"
      />
    </>
  );
}
