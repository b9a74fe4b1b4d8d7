import type { StripPoint, TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import type { TubePieceInputs } from "#shared/calculators/tube-piece/inputs.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { breakLine, DrawingSheet } from "./drawing-sheet.tsx";

const size = { width: 400, height: 330 };
const [left, right] = [24, 376];
const middle = 142;
/** Free plate between the two halves of a tube too long to draw whole. */
const gap = 16;

interface TubeSideViewProps {
  inputs: TubePieceInputs;
  results: TubePieceResults;
  show: (millimetres: number) => string;
}

/** The tube lying, A on the left with its heel up. A long one is broken in the middle, so that its ends can be seen. */
export function TubeSideView({ inputs, results, show }: TubeSideViewProps) {
  const plan = planTube(inputs, results);
  const { half, whole, fromA, fromB, tipA, tipB } = plan;
  const [top, low] = [middle - half, middle + half];
  const short = shortestLine(results.strip.curve);
  const shortY = middle - half * Math.cos((short.around * Math.PI) / 180);
  const lengthY = top - 34;
  const shortestY = low + 34;
  const cut = `${results.hardEnd === "either" ? "either end" : `end ${results.hardEnd}`} first`;
  return (
    <DrawingSheet
      {...size}
      title="The piece from the side"
      description={`Tip to tip ${show(results.tipToTip)}, shortest line ${show(results.shortest)}, rough cut ${show(results.roughCut)}. Cut ${cut}.`}
    >
      <path
        className="line-centre"
        d={
          whole
            ? stroke(left - 16, middle, right + 16, middle)
            : stroke(left - 16, middle, plan.breakA, middle) + stroke(plan.breakB, middle, right + 16, middle)
        }
      />
      <Ends plan={plan} curve={results.strip.curve} />
      <path
        className="line-dimension"
        d={
          stroke(tipA, middle, tipA, lengthY - 6) +
          stroke(tipB, middle, tipB, lengthY - 6) +
          stroke(fromA(short.a), shortY, fromA(short.a), shortestY + 6) +
          stroke(fromB(short.b), shortY, fromB(short.b), shortestY + 6)
        }
        strokeDasharray="3 3"
      />
      <Dimension
        from={[tipA, lengthY]}
        to={[tipB, lengthY]}
        text={`tip to tip ${show(results.tipToTip)}`}
        at={[200, lengthY - 9]}
      />
      <Dimension
        from={[fromA(short.a), shortestY]}
        to={[fromB(short.b), shortestY]}
        text={`shortest ${show(results.shortest)}`}
        at={[200, shortestY + 21]}
      />
      <Figure at={[8, 286]}>A</Figure>
      <Figure at={[392, 286]} anchor="end">
        B
      </Figure>
      <Figure
        at={[results.hardEnd === "B" ? 376 : 24, 286]}
        anchor={results.hardEnd === "B" ? "end" : "start"}
        soft
      >
        {results.hardEnd === "either" ? "ends alike" : "hard end: cut it first"}
      </Figure>
      <Figure at={[200, 318]} anchor="middle">{`rough cut ${show(results.roughCut)}`}</Figure>
    </DrawingSheet>
  );
}

function planTube({ branchOd }: TubePieceInputs, { tipToTip, ends }: TubePieceResults) {
  const deepest = Math.max(ends[0].deepest, ends[1].deepest, 1e-9);
  // Both cuts show whole at this scale, with some of the tube beyond them.
  const scale = Math.min(92 / branchOd, 120 / deepest);
  const whole = tipToTip * scale <= right - left;
  const centre = (left + right) / 2;
  const tipA = whole ? centre - (tipToTip * scale) / 2 : left;
  const tipB = whole ? centre + (tipToTip * scale) / 2 : right;
  return {
    whole,
    half: (branchOd * scale) / 2,
    tipA,
    tipB,
    /** Along the tube from A's tip: for what lies on A's side of the break, and on B's. */
    fromA: (along: number) => tipA + along * scale,
    fromB: (along: number) => tipB - (tipToTip - along) * scale,
    breakA: centre - gap / 2,
    breakB: centre + gap / 2,
  };
}

type Plan = ReturnType<typeof planTube>;

/** Both cut edges, near side full and far side hidden, and the tube's sides between them. */
function Ends({ plan, curve }: { plan: Plan; curve: readonly StripPoint[] }) {
  const { half, whole, fromA, fromB, breakA, breakB } = plan;
  const height = ({ around }: StripPoint) => middle - half * Math.cos((around * Math.PI) / 180);
  const edgeA = (near: boolean) => side(curve, near).map((point): Spot => [fromA(point.a), height(point)]);
  const edgeB = (near: boolean) => side(curve, near).map((point): Spot => [fromB(point.b), height(point)]);
  const sides = [0, 180].map((around) => {
    const point = nearest(curve, around);
    const y = height(point);
    const [a, b]: Spot[] = [
      [fromA(point.a), y],
      [fromB(point.b), y],
    ];
    if (!a || !b) return "";
    return whole ? linePath([a, b]) : linePath([a, [breakA, y]]) + linePath([[breakB, y], b]);
  });
  const breaks = whole
    ? ""
    : [breakA, breakB].map((x) => breakLine([x, middle - half], [x, middle + half])).join("");
  return (
    <>
      <path className="line-hidden" d={linePath(edgeA(false)) + linePath(edgeB(false))} />
      <path
        className="line-outline"
        d={linePath(edgeA(true)) + linePath(edgeB(true)) + sides.join("") + breaks}
      />
    </>
  );
}

/** Looking square to A's heel line with B on the right, places from 180 to 360 are on the near side. */
function side(curve: readonly StripPoint[], near: boolean): StripPoint[] {
  return curve.filter(({ around }) => (near ? around >= 180 : around <= 180));
}

function nearest(curve: readonly StripPoint[], around: number): StripPoint {
  return curve.reduce((best, point) =>
    Math.abs(point.around - around) < Math.abs(best.around - around) ? point : best,
  );
}

function shortestLine(curve: readonly StripPoint[]): StripPoint {
  return curve.reduce((best, point) => (point.b - point.a < best.b - best.a ? point : best));
}
