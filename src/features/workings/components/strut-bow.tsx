import type { StrutResults } from "#shared/calculators/strut/formula.ts";
import type { StrutInputs } from "#shared/calculators/strut/inputs.ts";
import { stepsBetween } from "./chart-scale.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";

const size = { width: 360, height: 330 };
const top = 44;
const tall = 226;
const middle = 176;

/** How far the bow is drawn, whatever it would be: it is there to be seen. */
const bow = 34;

interface StrutBowProps {
  inputs: StrutInputs;
  results: StrutResults;
  show: (millimetres: number) => string;
}

/**
 * The strut upright and its bowed shape: the half wave that is the effective length. A factor up to 1 lays it in the
 * middle of the strut; past 1 it begins at the top, which is then free to move, and ends below the foot.
 */
export function StrutBow({ inputs, results, show }: StrutBowProps) {
  const factor = inputs.effectiveLengthFactor;
  const wave = tall * Math.min(factor, 1);
  const length = factor > 1 ? tall / factor : tall;
  const waveTop = factor > 1 ? top : top + (length - wave) / 2;
  const foot = top + length;
  const shape = (y: number) => Math.cos((Math.PI * (y - waveTop - wave / 2)) / wave);
  const bent = results.governs === "buckling";
  // What is held stays on the line: both ends, or with a free top the foot alone.
  const held = shape(foot);
  const across = (y: number) => middle + (bent ? (factor > 1 ? -1 : 1) * bow * (shape(y) - held) : 0);
  const half = Math.min(20, Math.max(2, (tubeWidth(inputs) * length) / inputs.length / 2));
  const side = (offset: number, from = top, to = foot) =>
    linePath(stepsBetween(from, to, 60).map((y): Spot => [across(y) + offset, y]));
  return (
    <DrawingSheet
      {...size}
      title="The strut and how it would bow"
      description={`Length ${show(inputs.length)}, effective length ${show(results.effectiveLength)}. ${bent ? "The bow is drawn larger than it is." : "It is too short to bow and is squashed."}`}
    >
      <path className="line-centre" d={stroke(middle, top - 16, middle, foot + 16)} />
      {factor > 1 && bent ? <path className="line-hidden" d={side(0, foot, top + tall)} /> : null}
      <path className="line-outline" d={side(-half) + side(half)} />
      <End x={across(top)} y={top} way={-1} />
      <End x={across(foot)} y={foot} way={1} />
      <Upright x={78} from={top} to={foot} text={show(inputs.length)} anchor="end" name="length" />
      <Upright
        x={262}
        from={waveTop}
        to={waveTop + wave}
        text={show(results.effectiveLength)}
        anchor="start"
        name="effective"
      />
      <Figure at={[size.width / 2, size.height - 8]} anchor="middle" soft>
        {bent ? "Bow drawn larger than it is" : "Too short to bow"}
      </Figure>
    </DrawingSheet>
  );
}

function tubeWidth(inputs: StrutInputs): number {
  if (inputs.shape === "round") return inputs.od ?? 0;
  if (inputs.shape === "square") return inputs.side ?? 0;
  return Math.min(inputs.width ?? 0, inputs.height ?? 0);
}

/** The push on one end, arrow toward the strut. */
function End({ x, y, way }: { x: number; y: number; way: 1 | -1 }) {
  const tip = y + way * 3;
  return (
    <>
      <path className="line-outline" d={stroke(x, y + way * 26, x, tip + way * 8)} />
      <path
        className="fill-chalk"
        d={`${linePath([
          [x, tip],
          [x - 5, tip + way * 11],
          [x + 5, tip + way * 11],
        ])}Z`}
      />
      <path className="line-outline" d={stroke(x - 22, y, x + 22, y)} />
    </>
  );
}

interface UprightProps {
  x: number;
  from: number;
  to: number;
  name: string;
  text: string;
  anchor: "start" | "end";
}

/** An upright dimension with its name over the figure, on the outer side of its line. */
function Upright({ x, from, to, name, text, anchor }: UprightProps) {
  const out = anchor === "start" ? 1 : -1;
  const witness = (y: number) => stroke(middle + out * 30, y, x + out * 6, y);
  const centre = (from + to) / 2;
  return (
    <>
      <path className="line-dimension" d={witness(from) + witness(to)} />
      <Dimension from={[x, from]} to={[x, to]} text={text} at={[x + out * 7, centre + 14]} anchor={anchor} />
      <Figure at={[x + out * 7, centre - 4]} anchor={anchor} soft>
        {name}
      </Figure>
    </>
  );
}
