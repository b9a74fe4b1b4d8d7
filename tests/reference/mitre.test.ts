import { beforeAll, describe, expect, it } from "vitest";
import type { MitreResults } from "#shared/calculators/mitre/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";
import { compareEdge, edgeOn, type Kernel, loadKernel, tube, verticesOf } from "#tests/setup/solid-kernel.ts";

const settings = [
  { od: 44.5, wall: 2.5, turn: 90 },
  { od: 38.1, wall: 1.6, turn: 30 },
  { od: 60.3, wall: 3.2, turn: 60 },
  { od: 25, wall: 2, turn: 120 },
  { od: 48.3, wall: 4, turn: 5 },
];

let kernel: Kernel;

beforeAll(async () => {
  kernel = await loadKernel();
});

/** Depth at any place, from a curve of 720 steps by straight lines between them. */
function depthAt(curve: MitreResults["curve"], name: "depth" | "innerDepth", around: number): number {
  const step = (around / 360) * (curve.length - 1);
  const before = curve[Math.floor(step)]?.[name] ?? Number.NaN;
  const after = curve[Math.ceil(step)]?.[name] ?? Number.NaN;
  return before + (after - before) * (step - Math.floor(step));
}

/**
 * The cut as the kernel makes it from the meaning alone: two tubes leave the crossing of their axes, one along z and
 * one turned off its line toward x, and each keeps what lies nearer to its own axis, halfway by symmetry.
 */
function halved({ od, wall, turn }: (typeof settings)[number]) {
  const radians = (turn * Math.PI) / 180;
  // The next tube goes on from −z, turned toward +x: the halving plane has the difference of the two directions as normal.
  const next = [Math.sin(radians), 0, -Math.cos(radians)] as const;
  const normal: [number, number, number] = [0 - next[0], 0, 1 - next[2]];
  return tube(kernel, od, wall, -300, 300).trimByPlane(normal, 0);
}

describe("mitre against a solid kernel", () => {
  it.each(settings)("cuts both lines of $od × $wall turned $turn° to 0.05 mm", (inputs) => {
    const { curve, tipFromAxis } = resultsOf<MitreResults>("mitre", { ...inputs, samples: 720 });
    const vertices = verticesOf(halved(inputs));
    for (const [name, radius] of [
      ["depth", inputs.od / 2],
      ["innerDepth", inputs.od / 2 - inputs.wall],
    ] as const) {
      const edge = edgeOn(vertices, radius, (z) => z < 299);
      const { count, gap, difference } = compareEdge(
        edge,
        (around) => tipFromAxis + depthAt(curve, name, around),
      );
      expect(count).toBeGreaterThan(1000);
      expect(gap).toBeLessThan(1);
      expect(difference).toBeLessThan(0.05);
    }
  });

  it("leaves no gap and no overlap when the cut tube is set against its mirror image", () => {
    const inputs = { od: 44.5, wall: 2.5, turn: 90 };
    const one = halved(inputs);
    // The tube that goes on along +x: the first turned half round the line that halves the corner between +z and +x.
    const other = one.rotate([0, 0, 180]).rotate([0, 90, 0]);
    expect(one.intersect(other).volume()).toBeLessThan(1);
    const whole = 2 * one.volume();
    expect(one.add(other).volume()).toBeCloseTo(whole, 0);
  });
});

describe("mitre, textbook values", () => {
  // Common practice, no source: two equal tubes at a right angle are sawn at 45°, one diameter deep.
  it("saws a right angle at 45°, one diameter deep", () => {
    const { cutAngle, deepest } = resultsOf<MitreResults>("mitre", { od: 50, wall: 2, turn: 90 });
    expect(cutAngle).toBe(45);
    expect(deepest).toBeCloseTo(50, 9);
  });

  // A 45° cut through a circle is an ellipse with axes in the ratio √2: 4·a·E(1/2), E(1/2) = 1.3506438810 (Abramowitz
  // and Stegun, table 17.1).
  it("welds a right angle along an ellipse of 4·a·E(1/2)", () => {
    const { weldLength } = resultsOf<MitreResults>("mitre", { od: 50, wall: 2, turn: 90 });
    expect(weldLength).toBeCloseTo(4 * 25 * Math.SQRT2 * 1.350643881, 5);
  });
});
