import type { MitreResults } from "#shared/calculators/mitre/formula.ts";
import type { MitreInputs } from "#shared/calculators/mitre/inputs.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, breakLine, DrawingSheet, fitted } from "./drawing-sheet.tsx";

const size = { width: 400, height: 340 };

interface SideViewProps {
  inputs: MitreInputs;
  results: MitreResults;
  show: (millimetres: number) => string;
}

/** The corner from the side: the first tube comes from the left, the second turns off upward. */
export function MitreSideView({ inputs, results, show }: SideViewProps) {
  const plan = planCorner(inputs);
  const { at, r, slant, reach, first, second, scale } = plan;
  const [heel, toe] = [at(-slant, r), at(slant, -r)];
  const low = at(0, -r)[1] + 30;
  const square =
    plan.turn > 12 ? linePath([heel, [heel[0], low + 6]]) : stroke(heel[0], at(0, -r)[1], heel[0], low + 6);
  const wallOff = r - inputs.wall;
  return (
    <DrawingSheet
      {...size}
      title="The corner from the side"
      description={`Two tubes of ${show(inputs.od)} turn ${inputs.turn} degrees. The saw stands at ${results.cutAngle} degrees; the cut is ${show(results.deepest)} deep at the heel.`}
    >
      <path
        className="line-centre"
        d={
          linePath([at(-reach - 6 / scale, 0), at(plan.past, 0)]) +
          linePath([at(0, 0), second(reach + 6 / scale, 0)])
        }
      />
      <path
        className="line-hidden"
        d={[wallOff, -wallOff]
          .map((up) => linePath([first(reach, up), first(up * plan.tangent, up), second(reach, up)]))
          .join("")}
      />
      <path
        className="line-outline"
        d={
          linePath([first(reach, r), heel, second(reach, r)]) +
          linePath([first(reach, -r), toe, second(reach, -r)]) +
          linePath([heel, toe]) +
          breakLine(first(reach, -r), first(reach, r)) +
          breakLine(second(reach, -r), second(reach, r))
        }
      />
      <path className="line-dimension" strokeDasharray="3 3" d={square} />
      <path className="line-dimension" d={stroke(toe[0], toe[1] + 4, toe[0], low + 6)} />
      <Dimension
        from={[heel[0], low]}
        to={[toe[0], low]}
        text={`deepest ${show(results.deepest)}`}
        at={[Math.min(size.width - 80, Math.max(80, (heel[0] + toe[0]) / 2)), low + 22]}
      />
      <SawAngle plan={plan} angle={results.cutAngle} />
      <Turn plan={plan} turn={inputs.turn} />
      <Figure at={[size.width / 2, size.height - 6]} anchor="middle" soft>
        {`Both ends alike, saw ${results.cutAngle}° off square`}
      </Figure>
    </DrawingSheet>
  );
}

function planCorner({ od, turn }: MitreInputs) {
  const r = od / 2;
  const radians = (turn * Math.PI) / 180;
  const tangent = Math.tan(radians / 2);
  const slant = r * tangent;
  const reach = slant + 2.6 * r;
  const [cos, sin] = [Math.cos(radians), Math.sin(radians)];
  const along = (s: number, up: number): Spot => [s * cos - up * sin, s * sin + up * cos];
  // The turn's arc runs outside the corner: past the second tube's end where that lies nearly straight on.
  const arc = turn < 45 ? reach + 0.4 * r : 2.1 * r;
  const past = Math.max(arc + 0.25 * r, slant);
  const spots: Spot[] = [
    [-reach, r],
    [-reach, -r],
    [slant, -r],
    [past, 0],
    along(reach, r),
    along(reach, -r),
    ...arcSpots([0, 0], arc, 0, -turn),
  ];
  const { scale, at } = fitted(spots, { left: 16, top: 26, width: turn < 45 ? 318 : 352, height: 216 });
  return {
    r,
    turn,
    tangent,
    slant,
    reach,
    arc,
    past,
    scale,
    at,
    /** Along the first tube away from the corner, and to its heel side. */
    first: (s: number, up: number) => at(-s, up),
    second: (s: number, up: number) => at(...along(s, up)),
  };
}

type Plan = ReturnType<typeof planCorner>;

/** Between the square end at the heel and the cut. */
function SawAngle({ plan, angle }: { plan: Plan; angle: number }) {
  const { at, r, slant, scale, turn } = plan;
  if (turn <= 12) return null;
  const heel = at(-slant, r);
  const narrow = angle < 20;
  const radius = (narrow ? 1.5 : 1.15) * r * scale;
  // A narrow angle has no room for its figure: it stands beside it.
  const [label] = narrow
    ? ([[heel[0] - 6, heel[1] + radius + 2]] as const)
    : arcSpots(heel, radius + 15, -90 + angle / 2, -90 + angle / 2);
  return (
    <>
      <path className="line-dimension" d={linePath(arcSpots(heel, radius, -90, -90 + angle))} />
      {label ? (
        <Figure at={[label[0], label[1] + 5]} anchor={narrow ? "end" : "middle"}>{`${angle}°`}</Figure>
      ) : null}
    </>
  );
}

/** How far the second tube turns off the line of the first. */
function Turn({ plan, turn }: { plan: Plan; turn: number }) {
  const { at, arc, scale } = plan;
  const radius = arc * scale;
  const centre = at(0, 0);
  const bisector = Math.min(turn / 2, 60);
  const [label] = arcSpots(centre, radius + 8, bisector, bisector);
  if (!label) return null;
  return (
    <>
      <path className="line-dimension" d={linePath(arcSpots(centre, radius, 0, turn))} />
      <Figure at={[Math.min(label[0], size.width - 50), label[1] + 2]}>{`${turn}°`}</Figure>
    </>
  );
}
