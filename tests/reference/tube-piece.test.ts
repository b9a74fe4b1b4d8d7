import type { Manifold } from "manifold-3d";
import { beforeAll, describe, expect, it } from "vitest";
import type { TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";
import { compareEdge, edgeOn, type Kernel, loadKernel, tube, verticesOf } from "#tests/setup/solid-kernel.ts";

type End = {
  kind: string;
  headerOd?: number;
  angle?: number;
  offset?: number;
  turn?: number;
  setback?: number;
};

const settings: { between: number; branchOd: number; branchWall: number; clock: number; ends: [End, End] }[] =
  [
    {
      between: 200,
      branchOd: 38.1,
      branchWall: 2.5,
      clock: 90,
      ends: [
        { kind: "saddle", headerOd: 44.5, angle: 60 },
        { kind: "saddle", headerOd: 60.3, angle: 45 },
      ],
    },
    {
      between: 180,
      branchOd: 33.7,
      branchWall: 2.6,
      clock: 37,
      ends: [
        { kind: "saddle", headerOd: 60.3, angle: 75, offset: 8 },
        { kind: "saddle", headerOd: 48.3, angle: 50, offset: -5 },
      ],
    },
    {
      between: 150,
      branchOd: 25,
      branchWall: 2,
      clock: -120,
      ends: [
        { kind: "mitre", turn: 60 },
        { kind: "saddle", headerOd: 38, angle: 90, offset: 4 },
      ],
    },
    {
      between: 160,
      branchOd: 42.4,
      branchWall: 3.2,
      clock: 200,
      ends: [
        { kind: "square", setback: 12 },
        { kind: "mitre", turn: 90 },
      ],
    },
  ];

/** Enough for 0.05 mm here, since no branch comes near the side of its header; two cuts of 1024 sides take half a minute. */
const SIDES = 256;

let kernel: Kernel;

beforeAll(async () => {
  kernel = await loadKernel();
});

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/**
 * Takes one joint out of the tube, from the meaning of the inputs: z runs from A's joint to B's, seen so x is to the
 * right and −y up, so that counter-clockwise, looking from A to B, is from x toward −y.
 *
 * @param heel where the heel lies, counter-clockwise from x looking from A to B
 * @param along 1 at A, where the tube leaves its joint along z; −1 at B
 */
function cut(solid: Manifold, end: End, joint: number, heel: number, along: 1 | -1): Manifold {
  const toHeel = [Math.cos(radians(heel)), -Math.sin(radians(heel))] as const;
  // Looking at the coped end, places run counter-clockwise; at B that is the other way round than from A.
  const side = heel + along * 90;
  const toSide = [Math.cos(radians(side)), -Math.sin(radians(side))] as const;
  if (end.kind === "square") return solid.trimByPlane([0, 0, along], along * joint + (end.setback ?? 0));
  if (end.kind === "mitre") {
    const lean = Math.tan(radians((end.turn ?? 0) / 2));
    const normal: [number, number, number] = [-lean * toHeel[0], -lean * toHeel[1], along];
    const length = Math.hypot(...normal);
    return solid.trimByPlane(normal, (along * joint) / length);
  }
  const radius = (end.headerOd ?? 0) / 2;
  const offset = end.offset ?? 0;
  // The header's axis leans from the tube's own direction toward the heel; the tube passes it by the offset.
  const tilt = along === 1 ? (end.angle ?? 0) : 180 - (end.angle ?? 0);
  return solid.subtract(
    kernel.Manifold.cylinder(600, radius, radius, SIDES, true)
      .rotate([0, tilt, 0])
      .rotate([0, 0, -heel])
      .translate([-offset * toSide[0], -offset * toSide[1], joint]),
  );
}

const known = new Map<object, Manifold>();

/** The kernel's cuts are the slow part: once for shape and mass. */
function solidOf(inputs: (typeof settings)[number]): Manifold {
  const solid = known.get(inputs) ?? bothCuts(inputs);
  known.set(inputs, solid);
  return solid;
}

function bothCuts({
  between,
  branchOd,
  branchWall,
  clock,
  ends: [a, b],
}: (typeof settings)[number]): Manifold {
  // Ends that lie on a joint's axis stay inside it; mitres and squares need tube beyond.
  const from = a.kind === "saddle" ? 0 : -80;
  const to = b.kind === "saddle" ? between : between + 80;
  const rough = tube(kernel, branchOd, branchWall, from, to, SIDES);
  return cut(cut(rough, a, 0, 0, 1), b, between, clock, -1);
}

describe("tube-piece against a solid kernel", () => {
  it.each(settings)("cuts both ends of setting %#, clock $clock°, to 0.05 mm", (inputs) => {
    const { strip, ends, tipToTip } = resultsOf<TubePieceResults>("tube-piece", { ...inputs, samples: 720 });
    const vertices = verticesOf(solidOf(inputs));
    const at = (name: "a" | "b" | "innerA" | "innerB", around: number) => {
      // The kernel's y runs against the places round the tube.
      const step = (((360 - around) % 360) / 360) * 720;
      const before = strip.curve[Math.floor(step)]?.[name] ?? Number.NaN;
      const after = strip.curve[Math.ceil(step)]?.[name] ?? Number.NaN;
      return ends[0].tipFromAxis + before + (after - before) * (step - Math.floor(step));
    };
    const middle = inputs.between / 2;
    for (const [name, radius, within] of [
      ["a", inputs.branchOd / 2, (z: number) => z < middle],
      ["innerA", inputs.branchOd / 2 - inputs.branchWall, (z: number) => z < middle],
      ["b", inputs.branchOd / 2, (z: number) => z > middle],
      ["innerB", inputs.branchOd / 2 - inputs.branchWall, (z: number) => z > middle],
    ] as const) {
      const { count, gap, difference } = compareEdge(edgeOn(vertices, radius, within), (around) =>
        at(name, around),
      );
      expect(count).toBeGreaterThanOrEqual(SIDES);
      expect(gap).toBeLessThan(1.5);
      expect(difference).toBeLessThan(0.05);
    }
    const heights = vertices.map(([, , z]) => z);
    expect(Math.max(...heights) - Math.min(...heights)).toBeCloseTo(tipToTip, 1);
  });

  it.each(settings)("weighs setting %# as the kernel's volume does, to a thousandth", (inputs) => {
    const { mass } = resultsOf<TubePieceResults>("tube-piece", { ...inputs, density: 7850 });
    const kernelMass = solidOf(inputs).volume() * 7850e-9;
    expect(Math.abs(mass / kernelMass - 1)).toBeLessThan(1e-3);
  });
});
