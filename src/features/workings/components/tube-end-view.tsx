import type { TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import type { TubePieceInputs } from "#shared/calculators/tube-piece/inputs.ts";
import { Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, DrawingSheet } from "./drawing-sheet.tsx";

const size = { width: 300, height: 330 };
const centre: Spot = [150, 164];
const radius = 92;

interface TubeEndViewProps {
  inputs: TubePieceInputs;
  results: TubePieceResults;
  show: (millimetres: number) => string;
}

/** Looking from A to B, A's heel up: B's heel is turned from it by the clock, counter-clockwise. */
export function TubeEndView({ inputs, show }: TubeEndViewProps) {
  const { clock, branchOd, branchWall } = inputs;
  const bore = radius * (1 - (2 * branchWall) / branchOd);
  const away = Math.abs(((clock + 540) % 360) - 180);
  const apart = away > 32;
  const [x, y] = centre;
  const on = (reach: number, around: number): Spot =>
    arcSpots(centre, reach, 90 + around, 90 + around)[0] ?? centre;
  const name = on(radius + 26, clock);
  const arc = arcSpots(centre, radius * 0.52, 90, 90 + clock);
  return (
    <DrawingSheet
      {...size}
      title="The piece from end A"
      description={`Tube ${show(branchOd)} with a wall of ${show(branchWall)}. B's heel is turned ${clock} degrees from A's, counter-clockwise looking from A to B.`}
    >
      <path
        className="line-outline"
        d={linePath(arcSpots(centre, radius, 0, 360)) + linePath(arcSpots(centre, bore, 0, 360))}
      />
      <path
        className="line-centre"
        d={stroke(x - radius - 14, y, x + radius + 14, y) + stroke(x, y - 6, x, y + radius + 14)}
      />
      <path className="line-outline" d={linePath([centre, on(radius + 10, 0)])} />
      <path className="line-hidden" d={linePath([centre, on(radius + 10, clock)])} />
      {away > 2 ? (
        <>
          <path className="line-dimension" d={linePath(arc)} />
          <ArcHead arc={arc} />
        </>
      ) : null}
      <Figure at={[x, y - radius - 18]} anchor="middle">
        {apart ? "A's heel" : "A's and B's heels"}
      </Figure>
      {apart ? (
        <Figure at={[Math.min(276, Math.max(24, name[0])), name[1] + 5]} anchor="middle" soft>
          B
        </Figure>
      ) : null}
      <Figure at={[x, 20]} anchor="middle">
        {`clock ${clock}°`.replace("-", "−")}
      </Figure>
      <Figure at={[x, size.height - 8]} anchor="middle" soft>
        Looking from A to B
      </Figure>
    </DrawingSheet>
  );
}

/** An arrowhead at the end of the arc. */
function ArcHead({ arc }: { arc: readonly Spot[] }) {
  const [tip, before] = [arc.at(-1), arc.at(-2)];
  if (!tip || !before) return null;
  const length = Math.hypot(tip[0] - before[0], tip[1] - before[1]) || 1;
  const [ux, uy] = [(tip[0] - before[0]) / length, (tip[1] - before[1]) / length];
  const back: Spot = [tip[0] - 9 * ux, tip[1] - 9 * uy];
  return (
    <path
      className="fill-chalk-soft"
      d={`${linePath([tip, [back[0] - 3 * uy, back[1] + 3 * ux], [back[0] + 3 * uy, back[1] - 3 * ux]])}Z`}
    />
  );
}
