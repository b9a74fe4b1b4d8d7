import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import { Dimension, Figure, linePath, type Spot } from "./drawing-parts.tsx";

const view = { width: 300, height: 330 };

interface EndViewProps {
  inputs: SaddleCopeInputs;
  results: SaddleCopeResults;
  show: (millimetres: number) => string;
}

/** Along the header from the toe's side: the header is the circle that the hole saw cuts; a positive offset is to the right. */
export function CopeEndView({ inputs, show }: EndViewProps) {
  const [R, r, e] = [inputs.headerOd / 2, inputs.branchOd / 2, inputs.offset];
  const bore = r - inputs.branchWall;
  const scale = Math.min((view.width - 60) / (2 * R), (view.height - 100) / (3.4 * R));
  const middle = view.width / 2;
  const centreY = view.height - 34 - R * scale;
  const top = centreY - 2.2 * R * scale;
  const at = (out: number, up: number): Spot => [middle + out * scale, centreY - up * scale];
  const meets = (out: number) => Math.sqrt(Math.max(0, R * R - out * out));
  const wallLine = (out: number) => linePath([at(out, meets(out)), [middle + out * scale, top]]);
  const words = `Along the header: header ${show(inputs.headerOd)}, branch ${show(inputs.branchOd)} with a wall of ${show(inputs.branchWall)}, ${e === 0 ? "no offset" : `offset ${show(e)}`}.`;
  return (
    <svg viewBox={`0 0 ${view.width} ${view.height}`} role="img" aria-label={words} fontSize="15">
      <circle className="line-outline" cx={middle} cy={centreY} r={R * scale} />
      <path className="line-outline" d={wallLine(e - r) + wallLine(e + r)} />
      <path className="line-hidden" d={wallLine(e - bore) + wallLine(e + bore)} />
      <path
        className="line-outline"
        d={linePath([
          [middle + (e - r) * scale, top],
          [middle + (e + r) * scale, top],
        ])}
      />
      <path
        className="line-centre"
        d={`M${middle - R * scale - 14} ${centreY}h${2 * R * scale + 28}M${middle} ${centreY + R * scale + 12}V${top + 20}`}
      />
      <path className="line-centre" d={`M${middle + e * scale} ${centreY + 10}V${top - 10}`} />
      <path
        className="line-dimension"
        d={`M${middle + (e - r) * scale} ${top - 4}v-22M${middle + (e + r) * scale} ${top - 4}v-22`}
      />
      <Dimension
        from={[middle + (e - r) * scale, top - 20]}
        to={[middle + (e + r) * scale, top - 20]}
        text={`⌀ ${show(inputs.branchOd)}`}
        at={[middle + e * scale, top - 28]}
      />
      {e === 0 ? null : (
        <Dimension
          from={[middle, centreY - 1.5 * R * scale]}
          to={[middle + e * scale, centreY - 1.5 * R * scale]}
          text={`offset ${show(e)}`}
          at={[middle + (e * scale) / 2, centreY - 1.5 * R * scale - 9]}
        />
      )}
      <Figure at={[middle, view.height - 6]} anchor="middle" soft>
        {`Header and saw ⌀ ${show(inputs.headerOd)}`}
      </Figure>
    </svg>
  );
}
