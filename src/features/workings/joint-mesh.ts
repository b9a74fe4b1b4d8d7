import { BufferGeometry, CylinderGeometry, Float32BufferAttribute } from "three";
import {
  distanceFromAxis,
  type Joint,
  joint,
  type SaddleCopeResults,
} from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";

/** Steps round the tube: a multiple of four meets the quarter lines. */
const steps = 180;

/** The header, lying along x, mm. */
export function headerGeometry({ headerOd, branchOd, angle }: SaddleCopeInputs): BufferGeometry {
  const length = headerOd * 1.6 + (2.4 * branchOd) / Math.sin((angle * Math.PI) / 180);
  return new CylinderGeometry(headerOd / 2, headerOd / 2, length, 96, 1).rotateZ(Math.PI / 2);
}

/** The coped branch in place, mm: outside, bore, the cut face between them and the far end. */
export function branchGeometry(inputs: SaddleCopeInputs, results: SaddleCopeResults): BufferGeometry {
  const tube = joint(inputs);
  const far = results.tipFromAxis + results.deepest + 1.5 * inputs.branchOd;
  const rings = [
    ring((around) => place(tube, tube.r, around, distanceFromAxis(tube, tube.r, around))),
    ring((around) => place(tube, tube.r, around, far)),
    ring((around) => place(tube, tube.bore, around, far)),
    ring((around) => place(tube, tube.bore, around, distanceFromAxis(tube, tube.bore, around))),
  ];
  const positions = rings.flatMap((from, index) => band(from, rings[(index + 1) % rings.length] ?? from));
  const geometry = new BufferGeometry();
  // Triangles share no vertices, so that the cut face keeps its sharp edges.
  geometry.setAttribute("position", new Float32BufferAttribute(positions, 3));
  geometry.computeVertexNormals();
  return geometry;
}

type Vertex = [number, number, number];

function ring(at: (around: number) => Vertex): Vertex[] {
  return Array.from({ length: steps + 1 }, (_, step) => at((360 * step) / steps));
}

/** A place on the branch: x along the header toward the heel, y up, z toward the 90° side. */
function place({ cos, sin, e }: Joint, radius: number, around: number, s: number): Vertex {
  const radians = (around * Math.PI) / 180;
  const aside = radius * Math.cos(radians);
  return [s * cos + aside * sin, s * sin - aside * cos, radius * Math.sin(radians) + e];
}

function band(from: Vertex[], to: Vertex[]): number[] {
  return from.slice(1).flatMap((next, index) => {
    const [a, b, c] = [from[index] ?? next, to[index] ?? next, to[index + 1] ?? next];
    return [...a, ...next, ...b, ...b, ...next, ...c];
  });
}
