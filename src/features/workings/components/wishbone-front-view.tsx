import { cornerFrom, cornerPointsAt } from "#shared/calculators/wishbone-travel/corner.ts";
import type { WishboneTravelResults } from "#shared/calculators/wishbone-travel/formula.ts";
import type { WishboneTravelInputs } from "#shared/calculators/wishbone-travel/inputs.ts";
import type { InstantCentre } from "#shared/calculators/wishbone-travel/measures.ts";
import { Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { DrawingSheet, fitted } from "./drawing-sheet.tsx";
import { JigHeightWords } from "./jig-height-words.tsx";
import { placedWords, type Word } from "./placed-words.ts";
import {
  bodyOf,
  boundsOf,
  inside,
  movingParts,
  type Place,
  reachOf,
  sightLines,
  wheelEnds,
} from "./wishbone-lines.ts";

const size = { width: 360, height: 440 };

/** Where the words of the jig's heights begin: no other word reaches past it. */
const jigEdge: readonly Spot[] = [
  [264, 0],
  [264, size.height],
];

interface FrontViewProps {
  inputs: WishboneTravelInputs;
  results: WishboneTravelResults;
  show: (millimetres: number) => string;
  unit: string;
}

/** A left corner seen from the front, outboard to the right: at rest in thick line, at full bump and rebound in thin. */
export function WishboneFrontView({ inputs, results, show, unit }: FrontViewProps) {
  const corner = cornerFrom(inputs);
  if (!corner.ok) return null;
  const poses = [0, inputs.bump, -inputs.rebound].flatMap((travel) => {
    const points = cornerPointsAt(corner.value, travel);
    return points.ok ? [points.value] : [];
  });
  const [rest, ...others] = poses;
  const row = results.rows.find(({ travel }) => travel === 0);
  if (!rest || !row) return null;
  const table = inputs.tableUp;
  const body = bodyOf(inputs, poses, table);
  const reach = reachOf(body, row.instantCentre);
  const room = { left: 14, top: 70, width: table === undefined ? 332 : 232, height: 316 };
  const { at } = fitted([...body, ...reach], room);
  const rollCentre: Spot | null = row.rollCentre === null ? null : [0, rest.contact[2] + row.rollCentre];
  const box = boundsOf([...body, ...reach]);
  const seen = rollCentre && inside(rollCentre, box) ? rollCentre : null;
  const near = row.instantCentre && reach.length > 0 ? row.instantCentre : null;
  return (
    <DrawingSheet
      {...size}
      title="The corner from the front"
      description={`Left corner at rest, at ${show(inputs.bump)} ${unit} of bump and at ${show(inputs.rebound)} ${unit} of rebound. ${centresTold(row, show, unit)}`}
    >
      <path
        className="line-dimension"
        d={linePath([at(box.left, rest.contact[2]), at(box.right, rest.contact[2])])}
      />
      <path className="line-centre" d={linePath([at(0, box.low), at(0, box.high)])} />
      <path className="line-dimension" d={others.map((pose) => movingParts(inputs, pose, at)).join("")} />
      {row.instantCentre ? (
        <path className="line-hidden" d={sightLines(inputs, rest, row.instantCentre, at, box)} />
      ) : null}
      <path className="line-centre" d={linePath(wheelEnds(rest).map((spot) => at(...spot)))} />
      <path className="line-outline" d={movingParts(inputs, rest, at)} />
      {[inputs.lowerFront, inputs.lowerRear, inputs.upperFront, inputs.upperRear, inputs.rodInner].map(
        ([fore, out, up]) => (
          <Mark key={`${fore} ${out} ${up}`} spot={at(out, up)} />
        ),
      )}
      {[rest.lowerJoint, rest.upperJoint, rest.rodOuter].map(([fore, out, up]) => (
        <Mark key={`${fore} ${out} ${up}`} spot={at(out, up)} />
      ))}
      {seen ? <Cross spot={at(...seen)} /> : null}
      {near ? <Cross spot={at(near.out, near.up)} /> : null}
      {table === undefined ? null : (
        <JigHeightWords
          at={at}
          table={table}
          right={box.right}
          points={[
            { name: "upper", spot: [rest.upperJoint[1], rest.upperJoint[2]] },
            { name: "hub", spot: [rest.wheelCentre[1], rest.wheelCentre[2]] },
            { name: "lower", spot: [rest.lowerJoint[1], rest.lowerJoint[2]] },
          ]}
          show={show}
        />
      )}
      {centreWords(seen, near, at, table !== undefined).map(({ at: spot, text }) => (
        <Figure key={text} at={spot} anchor="middle">
          {text}
        </Figure>
      ))}
      <Figure at={[8, 20]}>
        {row.rollCentre === null ? "no roll centre" : `roll centre ${show(row.rollCentre)} up`}
      </Figure>
      <Figure at={[8, 42]} soft>
        {row.instantCentre
          ? `instant c. ${short(row.instantCentre.out, show)} out, ${short(row.instantCentre.up, show)} up`
          : "arms parallel: no instant centre"}
      </Figure>
      <Figure at={[size.width / 2, size.height - 8]} anchor="middle" soft>
        left wheel from the front
      </Figure>
    </DrawingSheet>
  );
}

const short = (length: number, show: (millimetres: number) => string) =>
  Math.abs(length) >= 1e5 ? "far" : show(length).replace("-", "−");

function centresTold(
  { rollCentre, instantCentre }: WishboneTravelResults["rows"][number],
  show: FrontViewProps["show"],
  unit: string,
): string {
  const roll =
    rollCentre === null
      ? "There is no roll centre."
      : `Roll centre ${show(rollCentre)} ${unit} above the contact point.`;
  const instant = instantCentre
    ? `Instant centre ${show(instantCentre.out)} ${unit} out and ${show(instantCentre.up)} ${unit} up.`
    : "The arms are parallel: there is no instant centre.";
  return `${roll} ${instant}`;
}

function centreWords(roll: Spot | null, instant: InstantCentre | null, at: Place, jigged: boolean): Word[] {
  const words: Word[] = [];
  if (roll) words.push({ at: at(...roll), out: [0.8, -0.6], text: "roll centre", soft: false });
  if (instant) {
    words.push({ at: at(instant.out, instant.up), out: [1, 0], text: "instant centre", soft: false });
  }
  return placedWords(words, jigged ? jigEdge : [], size);
}

function Mark({ spot: [x, y] }: { spot: Spot }) {
  return (
    <circle
      cx={x.toFixed(2)}
      cy={y.toFixed(2)}
      r="3.5"
      fill="var(--color-plate)"
      stroke="currentColor"
      strokeWidth="1.5"
    />
  );
}

/** A place that is found, not made: a ring with a cross in it. */
function Cross({ spot: [x, y] }: { spot: Spot }) {
  return (
    <>
      <circle
        cx={x.toFixed(2)}
        cy={y.toFixed(2)}
        r="5.5"
        fill="var(--color-plate)"
        stroke="var(--color-straw)"
        strokeWidth="2.5"
      />
      <path className="line-dimension" d={stroke(x - 9, y, x + 9, y) + stroke(x, y - 9, x, y + 9)} />
    </>
  );
}
