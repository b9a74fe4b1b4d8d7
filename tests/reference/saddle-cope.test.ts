import { beforeAll, describe, expect, it } from "vitest";
import { distanceFromAxis, joint } from "#shared/calculators/saddle-cope/formula.ts";
import { saddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import { resultsOf } from "#tests/setup/calculator.ts";
import {
  compareEdge,
  edgeOn,
  type Kernel,
  loadKernel,
  SIDES,
  tube,
  type Vertex,
  verticesOf,
} from "#tests/setup/solid-kernel.ts";

const TOLERANCE = 0.05;

const settings = [
  { headerOd: 50, branchOd: 50, branchWall: 2, angle: 90, offset: 0 },
  { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60, offset: 0 },
  { headerOd: 60.3, branchOd: 33.7, branchWall: 2.6, angle: 45, offset: 8 },
  { headerOd: 48.3, branchOd: 42.4, branchWall: 3.2, angle: 30, offset: -2 },
  { headerOd: 38, branchOd: 25, branchWall: 1.5, angle: 75, offset: 6 },
];

let kernel: Kernel;

beforeAll(async () => {
  kernel = await loadKernel();
});

const known = new Map<object, Vertex[]>();

/**
 * Vertices of the coped branch in the branch's own frame: z along the branch from the header axis, x toward the heel,
 * y toward the 90° side. The kernel's cut is the slow part: once for both lines of a setting.
 */
function copedVertices(inputs: (typeof settings)[number]): Vertex[] {
  const radius = inputs.headerOd / 2;
  // The header's axis stands at the angle to z, in the plane of the heel, and is off the branch by −offset.
  const vertices =
    known.get(inputs) ??
    verticesOf(
      tube(kernel, inputs.branchOd, inputs.branchWall, 0, 400).subtract(
        kernel.Manifold.cylinder(1000, radius, radius, SIDES, true)
          .rotate([0, inputs.angle, 0])
          .translate([0, -inputs.offset, 0]),
      ),
    );
  known.set(inputs, vertices);
  return vertices;
}

/** Largest difference along the branch between kernel and formula on one cylinder, and the widest unseen gap. */
function compare(inputs: (typeof settings)[number], radius: number) {
  const formula = joint(saddleCopeInputs.parse(inputs));
  const edge = edgeOn(copedVertices(inputs), radius, (z) => z < 399);
  return compareEdge(edge, (around) => distanceFromAxis(formula, radius, around));
}

describe("saddle-cope against a solid kernel", () => {
  it.each(settings)(
    "cuts the outside line of $branchOd on $headerOd at $angle°, offset $offset, to 0.05 mm",
    (inputs) => {
      const { count, gap, difference } = compare(inputs, inputs.branchOd / 2);
      expect(count).toBeGreaterThan(1000);
      expect(gap).toBeLessThan(1);
      expect(difference).toBeLessThan(TOLERANCE);
    },
  );

  it.each(settings)(
    "cuts the bore line of $branchOd on $headerOd at $angle°, offset $offset, to 0.05 mm",
    (inputs) => {
      const { count, gap, difference } = compare(inputs, inputs.branchOd / 2 - inputs.branchWall);
      expect(count).toBeGreaterThan(1000);
      expect(gap).toBeLessThan(1);
      expect(difference).toBeLessThan(TOLERANCE);
    },
  );

  it("finds the kernel's tip where the results put the squared end", () => {
    const inputs = settings[2];
    if (!inputs) throw new Error("the setting is gone");
    const tip = Math.min(...copedVertices(inputs).map(([, , z]) => z));
    expect(resultsOf("saddle-cope", inputs)).toMatchObject({ tipFromAxis: expect.closeTo(tip, 1) });
  });
});
