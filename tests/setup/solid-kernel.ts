import Module, { type Manifold } from "manifold-3d";

/**
 * Sides of the prisms that stand for cylinders. A prism inscribed in a circle of radius R lies inside it by up to
 * R(1 − cos(π/n)); across the sides the square root in a cope magnifies that. With 1024 the two together stay well
 * under the 0.05 mm compared.
 */
export const SIDES = 1024;

export type Vertex = [x: number, y: number, z: number];

/** A general-purpose solid kernel (manifold-3d), made ready. */
export async function loadKernel() {
  const kernel = await Module();
  kernel.setup();
  return kernel;
}

export type Kernel = Awaited<ReturnType<typeof loadKernel>>;

/** A tube along z, from `from` to `to`. */
export function tube(
  { Manifold }: Kernel,
  od: number,
  wall: number,
  from: number,
  to: number,
  sides = SIDES,
): Manifold {
  const cylinder = (radius: number) =>
    Manifold.cylinder(to - from, radius, radius, sides).translate([0, 0, from]);
  return cylinder(od / 2).subtract(cylinder(od / 2 - wall));
}

export function verticesOf(solid: Manifold): Vertex[] {
  const mesh = solid.getMesh();
  return Array.from({ length: mesh.numVert }, (_, index) => {
    const [x = 0, y = 0, z = 0] = mesh.vertProperties.slice(index * mesh.numProp, index * mesh.numProp + 3);
    return [x, y, z];
  });
}

/**
 * Vertices of a cut edge on the cylinder of this radius, as places round the z axis in degrees and heights, in order.
 *
 * @param within keeps the end that is looked at
 */
export function edgeOn(vertices: readonly Vertex[], radius: number, within: (z: number) => boolean) {
  return vertices
    .filter(([x, y, z]) => Math.abs(Math.hypot(x, y) - radius) < 1e-3 && within(z))
    .map(([x, y, z]) => ({ around: ((Math.atan2(y, x) * 180) / Math.PI + 360) % 360, z }))
    .sort((a, b) => a.around - b.around);
}

/** How many vertices an edge has, its widest gap in degrees, and the largest difference from a formula in mm. */
export function compareEdge(edge: ReturnType<typeof edgeOn>, formula: (around: number) => number) {
  const gaps = edge.map(({ around }, index) => (edge[index + 1]?.around ?? 360) - around);
  const differences = edge.map(({ around, z }) => Math.abs(z - formula(around)));
  return { count: edge.length, gap: Math.max(...gaps), difference: Math.max(...differences) };
}
