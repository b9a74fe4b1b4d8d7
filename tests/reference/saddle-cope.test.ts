import Module from "manifold-3d";
import { beforeAll, describe, expect, it } from "vitest";
import { runCalculator } from "#shared/calculators/registry.ts";
import { distanceFromAxis, joint } from "#shared/calculators/saddle-cope/formula.ts";
import { saddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";

/**
 * The cut edge from a general-purpose solid kernel (manifold-3d): a branch tube less a header cylinder, both as prisms.
 *
 * A prism of n sides inscribed in a circle of radius R lies inside it by up to R(1 − cos(π/n)); across the sides the
 * square root in the formula magnifies that. With 1024 sides the two together stay well under the 0.05 mm compared.
 */
const SIDES = 1024;
const TOLERANCE = 0.05;

const settings = [
  { headerOd: 50, branchOd: 50, branchWall: 2, angle: 90, offset: 0 },
  { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60, offset: 0 },
  { headerOd: 60.3, branchOd: 33.7, branchWall: 2.6, angle: 45, offset: 8 },
  { headerOd: 48.3, branchOd: 42.4, branchWall: 3.2, angle: 30, offset: -2 },
  { headerOd: 38, branchOd: 25, branchWall: 1.5, angle: 75, offset: 6 },
];

let kernel: Awaited<ReturnType<typeof Module>>;

beforeAll(async () => {
  kernel = await Module();
  kernel.setup();
});

/**
 * Vertices of the coped branch in the branch's own frame: z along the branch from the header axis, x toward the heel,
 * y toward the 90° side.
 */
function copedVertices(inputs: (typeof settings)[number]): [number, number, number][] {
  const { Manifold } = kernel;
  const length = 400;
  const outside = Manifold.cylinder(length, inputs.branchOd / 2, inputs.branchOd / 2, SIDES);
  const bore = Manifold.cylinder(
    length,
    inputs.branchOd / 2 - inputs.branchWall,
    inputs.branchOd / 2 - inputs.branchWall,
    SIDES,
  );
  // The header's axis stands at the angle to z, in the plane of the heel, and is off the branch by −offset.
  const header = Manifold.cylinder(1000, inputs.headerOd / 2, inputs.headerOd / 2, SIDES, true)
    .rotate([0, inputs.angle, 0])
    .translate([0, -inputs.offset, 0]);
  const mesh = outside.subtract(bore).subtract(header).getMesh();
  return Array.from({ length: mesh.numVert }, (_, index) => {
    const [x = 0, y = 0, z = 0] = mesh.vertProperties.slice(index * mesh.numProp, index * mesh.numProp + 3);
    return [x, y, z];
  });
}

const known = new Map<object, [number, number, number][]>();

/** The kernel's cut is the slow part: once for both lines of a setting. */
function verticesOf(inputs: (typeof settings)[number]) {
  const vertices = known.get(inputs) ?? copedVertices(inputs);
  known.set(inputs, vertices);
  return vertices;
}

/** Largest difference along the branch between kernel and formula on one cylinder, and the widest unseen gap. */
function compare(inputs: (typeof settings)[number], radius: number) {
  const tube = joint(saddleCopeInputs.parse(inputs));
  const edge = verticesOf(inputs)
    .filter(([x, y, z]) => Math.abs(Math.hypot(x, y) - radius) < 1e-3 && z < 399)
    .map(([x, y, z]) => ({ around: ((Math.atan2(y, x) * 180) / Math.PI + 360) % 360, z }))
    .sort((a, b) => a.around - b.around);
  const gaps = edge.map(({ around }, index) => (edge[index + 1]?.around ?? 360) - around);
  const differences = edge.map(({ around, z }) => Math.abs(z - distanceFromAxis(tube, radius, around)));
  return { count: edge.length, gap: Math.max(...gaps), difference: Math.max(...differences) };
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
    const run = runCalculator("saddle-cope", inputs);
    if (!inputs || !run.ok) throw new Error("the setting does not work");
    const tip = Math.min(...verticesOf(inputs).map(([, , z]) => z));
    expect(run.value.results).toMatchObject({ tipFromAxis: expect.closeTo(tip, 1) });
  });
});
