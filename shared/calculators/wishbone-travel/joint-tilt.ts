import { angleBetween, cross, dot, subtract, unit, type Vector } from "../vectors.ts";
import { type Arm, broughtBack } from "./arm.ts";

const degrees = (radians: number) => (radians * 180) / Math.PI;

/** How a joint's housing stands against the swing that the travel asks of it; degrees. */
export interface JointTilt {
  /** Angle between the housing as set and the middle of the swing. */
  tilt: number;
  /** The same in the view from the front: positive, the housing's top leans out. */
  tiltOut: number;
  /** And from the side: positive, its top leans back. */
  tiltBack: number;
  /** Swing to one side once the housing is tilted so. */
  swing: number;
  /** Swing to one side with the housing as set. */
  swingAsSet: number;
  /** What the rated swing leaves after tilting; null without a rated swing. */
  spare: number | null;
}

/**
 * Housing tilt that centres a joint's swing.
 *
 * The housing is part of the arm, the stud part of the upright and lies along the steering axis, so that steering turns
 * the joint without swinging it. The two stud directions that lie farthest apart, seen from the arm, give the middle.
 *
 * @param housing direction of the housing's bore at rest; left out: square to the arm
 * @param travel stud direction and arm angle of each row
 */
export function jointTilt(
  arm: Arm,
  joint: Vector,
  housing: Vector | undefined,
  travel: readonly { stud: Vector; swing: number }[],
  rated: number | undefined,
): JointTilt {
  const studs = travel.map(({ stud, swing }) => broughtBack(arm, stud, swing));
  const middle = middleOf(studs);
  const bore = unit(housing ?? cross(arm.axis, subtract(joint, arm.centre)));
  const facing: Vector = dot(bore, middle) < 0 ? [-bore[0], -bore[1], -bore[2]] : bore;
  const swing = widest(middle, studs);
  return {
    tilt: degrees(widest(middle, [facing])),
    tiltOut: between(lean(middle[1], middle[2]), lean(facing[1], facing[2])),
    tiltBack: between(lean(-middle[0], middle[2]), lean(-facing[0], facing[2])),
    swing: degrees(swing),
    swingAsSet: degrees(widest(facing, studs)),
    spare: rated === undefined ? null : rated - degrees(swing),
  };
}

const lean = (aside: number, up: number) => degrees(Math.atan2(aside, up));

/** From one lean to another the short way round. */
const between = (to: number, from: number) => ((((to - from + 180) % 360) + 360) % 360) - 180;

function middleOf(studs: readonly Vector[]): Vector {
  let [one, other]: [Vector, Vector] = [
    [0, 0, 1],
    [0, 0, 1],
  ];
  let least = Number.POSITIVE_INFINITY;
  for (const [index, stud] of studs.entries()) {
    for (let next = index; next < studs.length; next += 1) {
      const against = studs[next] ?? stud;
      const cosine = dot(stud, against);
      if (cosine < least) [least, one, other] = [cosine, stud, against];
    }
  }
  return unit([one[0] + other[0], one[1] + other[1], one[2] + other[2]]);
}

const widest = (from: Vector, directions: readonly Vector[]) =>
  directions.reduce((most, direction) => Math.max(most, angleBetween(from, direction)), 0);
