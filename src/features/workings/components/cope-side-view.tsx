import {
  distanceFromAxis,
  type Joint,
  joint,
  type SaddleCopeResults,
} from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import { Dimension, Figure, linePath, type Spot } from "./drawing-parts.tsx";
import { breakLine } from "./drawing-sheet.tsx";

const view = { width: 400, height: 330 };
const border = 46;

interface SideViewProps {
  inputs: SaddleCopeInputs;
  results: SaddleCopeResults;
  show: (millimetres: number) => string;
}

/** The joint from the 90° side: header lying, branch rising to the right, so that the heel is on the right. */
export function CopeSideView({ inputs, results, show }: SideViewProps) {
  const plan = planSideView(joint(inputs), results);
  const { at, tube, length, reach } = plan;
  const tip = results.tipFromAxis;
  const centre = at(0, 0);
  return (
    <svg
      viewBox={`0 0 ${view.width} ${view.height}`}
      role="img"
      aria-label={sideWords(inputs, results, show)}
      fontSize="15"
    >
      <path
        className="line-centre"
        d={linePath([
          plan.flat(reach.left - 12 / plan.scale, 0),
          plan.flat(reach.right + 12 / plan.scale, 0),
        ])}
      />
      <path className="line-centre" d={linePath([at(-tube.R * 0.25, 0), at(length * 1.06, 0)])} />
      <path className="line-outline" d={headerOutline(plan)} />
      <path className="line-hidden" d={edgePath(plan, false)} />
      <path className="line-outline" d={edgePath(plan, true)} />
      <path
        className="line-outline"
        d={`${linePath([at(plan.heelFrom, tube.r), at(length, tube.r)])}${linePath([at(plan.toeFrom, -tube.r), at(length, -tube.r)])}`}
      />
      <path className="line-outline" d={breakLine(at(length, -tube.r), at(length, tube.r))} />
      <path
        className="line-dimension"
        d={linePath([at(tip, -tube.r - plan.gap * 1.3), at(tip, tube.r + plan.gap * 1.3)])}
        strokeDasharray="3 3"
      />
      <path
        className="line-dimension"
        d={linePath([at(plan.heel, tube.r), at(plan.heel, tube.r + plan.gap * 1.3)])}
      />
      <path
        className="line-dimension"
        d={linePath([at(plan.toe, -tube.r), at(plan.toe, -tube.r - plan.gap * 1.3)])}
      />
      <DepthDimension plan={plan} side={1} text={`heel ${show(results.heelDepth)}`} />
      <DepthDimension plan={plan} side={-1} text={`toe ${show(results.toeDepth)}`} />
      <AngleArc plan={plan} angle={inputs.angle} />
      <path
        className="line-dimension"
        d={`M${centre[0] - 7} ${centre[1]}h14M${centre[0]} ${centre[1] - 7}v14`}
      />
      <circle cx={centre[0]} cy={centre[1]} r="4" className="line-dimension" />
      <Figure at={[view.width / 2, view.height - 8]} anchor="middle" soft>
        {sawWords(results, show)}
      </Figure>
    </svg>
  );
}

function sideWords(
  inputs: SaddleCopeInputs,
  results: SaddleCopeResults,
  show: (length: number) => string,
): string {
  return `The joint from the side: a branch meets the header at ${inputs.angle} degrees. Heel cut ${show(results.heelDepth)} deep, toe ${show(results.toeDepth)}.`;
}

function sawWords({ holeSaw }: SaddleCopeResults, show: (length: number) => string): string {
  return Math.abs(holeSaw.fromTip) < 0.05
    ? "Saw centre on the squared end"
    : `Saw centre ${show(Math.abs(holeSaw.fromTip))} beyond the end`;
}

/** Where everything goes: lengths along the branch (s) and to its heel side (n), in mm, put on the sheet by `at`. */
function planSideView(tube: Joint, results: SaddleCopeResults) {
  const heel = distanceFromAxis(tube, tube.r, 0);
  const toe = distanceFromAxis(tube, tube.r, 180);
  const length = Math.max(heel, toe) + 2.4 * tube.r;
  const across = (s: number, n: number) => s * tube.cos + n * tube.sin;
  const up = (s: number, n: number) => s * tube.sin - n * tube.cos;
  const reach = {
    left: Math.min(across(toe, -tube.r), across(0, 0)) - 0.9 * tube.R,
    right: Math.max(across(heel, tube.r), across(length, 0) * 0.9) + 1.2 * tube.R,
  };
  const ends = {
    left: Math.min(reach.left, across(length, -tube.r)),
    right: Math.max(reach.right, across(length, tube.r)),
  };
  const top = up(length, -tube.r);
  const scale = Math.min(
    (view.width - 2 * border) / (ends.right - ends.left),
    (view.height - border - 30) / (top + tube.R),
  );
  const left = (view.width - scale * (ends.right - ends.left)) / 2;
  const flat = (x: number, y: number): Spot => [left + (x - ends.left) * scale, 18 + (top - y) * scale];
  const at = (s: number, n: number) => flat(across(s, n), up(s, n));
  // Behind the header, the part of the branch below its top line is not seen.
  const clear = (n: number) => (tube.R + n * tube.cos) / tube.sin;
  return {
    tube,
    results,
    heel,
    toe,
    length,
    reach,
    scale,
    flat,
    at,
    across,
    up,
    gap: 16 / scale,
    heelFrom: tube.e < 0 ? clear(tube.r) : heel,
    toeFrom: tube.e < 0 ? clear(-tube.r) : toe,
  };
}

type Plan = ReturnType<typeof planSideView>;

function headerOutline({ tube, flat, reach, across }: Plan): string {
  const lower = linePath([flat(reach.left, -tube.R), flat(reach.right, -tube.R)]);
  const ends =
    breakLine(flat(reach.left, tube.R), flat(reach.left, -tube.R)) +
    breakLine(flat(reach.right, tube.R), flat(reach.right, -tube.R));
  const top = (from: number, to: number) => linePath([flat(from, tube.R), flat(to, tube.R)]);
  if (tube.e <= -tube.r) return lower + ends + top(reach.left, reach.right);
  // The branch stands over the header's top line between the two places where its surface meets that line.
  const half = tube.e >= tube.r ? tube.r : Math.sqrt(tube.r ** 2 - tube.e ** 2);
  const meets = (n: number) => across((tube.R + n * tube.cos) / tube.sin, n);
  return lower + ends + top(reach.left, meets(-half)) + top(meets(half), reach.right);
}

/** The cut edge: seen where it is on the near side of both tubes, hidden elsewhere. */
function edgePath({ tube, at }: Plan, seen: boolean): string {
  const steps = 180;
  let path = "";
  let run: Spot[] = [];
  for (let step = 0; step <= steps; step += 1) {
    const around = (360 * step) / steps;
    const radians = (around * Math.PI) / 180;
    const sine = Math.sin(radians);
    const near = sine >= -1e-9 && tube.r * sine + tube.e >= -1e-9;
    const spot = at(distanceFromAxis(tube, tube.r, around), tube.r * Math.cos(radians));
    if (near === seen) run.push(spot);
    else if (run.length > 0) {
      path += linePath([...run, spot]);
      run = [];
    }
  }
  return run.length > 1 ? path + linePath(run) : path;
}

/** Below this angle the branch lies over the place above the heel, and its figure goes below the header. */
const steep = 50;
const textWidth = (text: string) => text.length * 9;

/** How deep the heel (side 1) or toe (−1) is cut, its figure where no line of the joint runs. */
function DepthDimension({ plan, side, text }: { plan: Plan; side: 1 | -1; text: string }) {
  const { tube, results, at, flat, gap } = plan;
  const edge = side === 1 ? plan.heel : plan.toe;
  const from = at(results.tipFromAxis, side * (tube.r + gap));
  const to = at(edge, side * (tube.r + gap));
  const witness = at(edge, side * (tube.r + gap * 1.3));
  const above = flat(0, tube.R)[1] - 9;
  const room = textWidth(text) + 4;
  if (side === -1) {
    const place: Spot = [Math.max(room, witness[0] - 5), Math.min(witness[1] - 5, above)];
    return <Dimension from={from} to={to} text={text} at={place} anchor="end" />;
  }
  if (Math.atan2(tube.sin, tube.cos) * 180 >= steep * Math.PI) {
    const place: Spot = [Math.min(view.width - room, witness[0] + 5), above];
    return <Dimension from={from} to={to} text={text} at={place} anchor="start" />;
  }
  const middle: Spot = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  const below = flat(0, -tube.R)[1] + 24;
  const x = Math.min(view.width - room / 2, Math.max(room / 2, middle[0]));
  return (
    <>
      <path className="line-dimension" d={linePath([middle, [x, below - 14]])} />
      <Dimension from={from} to={to} text={text} at={[x, below]} />
    </>
  );
}

function AngleArc({ plan, angle }: { plan: Plan; angle: number }) {
  const { tube, flat, scale } = plan;
  const radius = Math.min(plan.length * 0.84, plan.reach.right - 4 / scale);
  const spot = (degrees: number, out = 0): Spot => {
    const radians = (degrees * Math.PI) / 180;
    return flat((radius + out) * Math.cos(radians), (radius + out) * Math.sin(radians));
  };
  // From clear of the header, and of the figure above it, up to the branch's own axis.
  const clear = Math.min(0.95, (tube.R + 28 / scale) / radius);
  const from = Math.min(angle * 0.8, (Math.asin(clear) * 180) / Math.PI);
  const [start, end] = [spot(from), spot(angle)];
  const text = `${angle}°`;
  const edge = angle - (Math.asin(Math.min(1, tube.r / radius)) * 180) / Math.PI;
  const beyond = plan.at(plan.length * 1.06, 0);
  // Right of the arc where that is clear of the branch, else at the end of the branch's axis.
  const label: Spot =
    angle >= steep
      ? spot(Math.min((from + angle) / 2, edge - 5), 8 / scale)
      : [Math.min(view.width - textWidth(text), beyond[0] + 6), beyond[1] + 2];
  return (
    <>
      <path
        className="line-dimension"
        d={`M${start[0].toFixed(2)} ${start[1].toFixed(2)}A${radius * scale} ${radius * scale} 0 0 0 ${end[0].toFixed(2)} ${end[1].toFixed(2)}`}
      />
      <Figure at={label}>{text}</Figure>
    </>
  );
}
