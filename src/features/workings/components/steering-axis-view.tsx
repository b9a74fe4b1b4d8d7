import { axisPoints } from "#shared/calculators/steering-axis/formula.ts";
import type { SteeringAxisInputs } from "#shared/calculators/steering-axis/inputs.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, DrawingSheet, fitted } from "./drawing-sheet.tsx";

type Joint = SteeringAxisInputs["lower"];

const size = { width: 360, height: 400 };
const room = { left: 34, top: 64, width: 292, height: 252 };

interface SteeringAxisViewProps {
  inputs: SteeringAxisInputs;
  title: string;
  /** What counts to the right in this view, mm. */
  across: (joint: Joint) => number;
  /** Which way the axis points, degrees counter-clockwise from the right. */
  lean: number;
  /** Words: the axis's angle, the same the other way up, the distance at the ground and that at hub height. */
  angle: string;
  thin: string;
  ground: string;
  hub?: string;
  caption: string;
  /** Whether the wheel is seen as a circle. */
  round?: boolean;
}

/** One view of the axis with the wheel, its distances at the ground and at hub height. */
export function SteeringAxisView(props: SteeringAxisViewProps) {
  const { inputs, title, across, angle, thin, ground, hub, caption, round = false } = props;
  const now = axisPoints(inputs);
  const other = axisPoints({ ...inputs, turnedOver: !inputs.turnedOver });
  const flat = (joint: Joint): Spot => [across(joint), joint.up];
  const { wheelCentre, contact } = now;
  const radius = inputs.loadedRadius;
  const top: Joint = {
    out: 2 * wheelCentre.out - contact.out,
    up: -contact.up,
    fore: wheelCentre.fore,
  };
  const sides: Spot[] = round
    ? [
        [across(wheelCentre) - radius, -radius],
        [across(wheelCentre) + radius, radius],
      ]
    : [flat(top), flat(contact)];
  const axes = [now, other].flatMap(({ lower, upper, axisAtGround }) => [lower, upper, axisAtGround]);
  const { at, scale } = fitted([...sides, flat(wheelCentre), flat(contact), ...axes.map(flat)], room);
  const spot = (joint: Joint) => at(...flat(joint));
  const [foot, floor] = [spot(now.axisAtGround), spot(contact)];
  const centre = spot(wheelCentre);
  const hubSpot = spot(now.axisAtHub);
  return (
    <DrawingSheet
      {...size}
      title={title}
      description={`${angle}, ${thin}, ${ground}${hub ? `, ${hub}` : ""}.`}
    >
      <path className="line-dimension" d={stroke(14, floor[1], size.width - 14, floor[1])} />
      {round ? (
        <circle
          cx={centre[0].toFixed(2)}
          cy={centre[1].toFixed(2)}
          r={(radius * scale).toFixed(2)}
          className="line-centre"
        />
      ) : (
        <path className="line-centre" d={linePath([spot(top), floor])} />
      )}
      <path
        className="line-dimension"
        d={linePath([spot(other.axisAtGround), spot(other.lower), spot(other.upper)])}
      />
      <path className="line-hidden" d={linePath([foot, spot(now.lower)])} />
      <path className="line-outline" d={linePath([spot(now.lower), spot(now.upper)])} />
      <LeanArc foot={foot} tip={spot(now.upper)} lean={props.lean} />
      {[now.lower, now.upper, wheelCentre].map((joint, index) => (
        <Ring key={["lower", "upper", "wheel"][index]} spot={spot(joint)} />
      ))}
      {hub ? (
        <Dimension
          from={hubSpot}
          to={centre}
          text={hub}
          at={kept((hubSpot[0] + centre[0]) / 2, centre[1] - 9, hub)}
        />
      ) : null}
      <path
        className="line-dimension"
        d={
          stroke(foot[0], foot[1] + 3, foot[0], foot[1] + 28) +
          stroke(floor[0], floor[1] + 3, floor[0], floor[1] + 28)
        }
      />
      <Dimension
        from={[foot[0], foot[1] + 22]}
        to={[floor[0], floor[1] + 22]}
        text={ground}
        at={kept((foot[0] + floor[0]) / 2, floor[1] + 46, ground)}
      />
      <Figure at={[8, 20]}>{angle}</Figure>
      <Figure at={[8, 42]} soft>
        {thin}
      </Figure>
      <Figure at={[size.width / 2, size.height - 8]} anchor="middle" soft>
        {caption}
      </Figure>
    </DrawingSheet>
  );
}

/** From the upright line through the axis's foot to the axis. */
function LeanArc({ foot, tip, lean }: { foot: Spot; tip: Spot; lean: number }) {
  const radius = Math.min(110, 0.7 * Math.hypot(tip[0] - foot[0], tip[1] - foot[1]));
  return (
    <path
      className="line-dimension"
      d={
        stroke(foot[0], foot[1], foot[0], Math.max(room.top, foot[1] - radius - 12)) +
        linePath(arcSpots(foot, Math.min(radius, foot[1] - room.top), 90, lean))
      }
    />
  );
}

/** The middle of a word, moved in from the sheet's ends. */
function kept(x: number, y: number, word: string): Spot {
  const half = (word.length * 9) / 2 + 4;
  return [Math.min(size.width - half, Math.max(half, x)), y];
}

function Ring({ spot: [x, y] }: { spot: Spot }) {
  return (
    <circle
      cx={x.toFixed(2)}
      cy={y.toFixed(2)}
      r="4"
      fill="var(--color-plate)"
      stroke="currentColor"
      strokeWidth="1.5"
    />
  );
}
