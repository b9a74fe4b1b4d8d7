import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { FilletWeldInputs } from "./inputs.ts";

/** Results of `fillet-weld`: mm, N/mm, N. */
export interface FilletWeldResults {
  throat: number;
  /** Of a weld with equal legs. */
  leg: number;
  /** Against a load along the weld: 1; across it, by the directional method: 1.22. */
  angleFactor: number;
  resistancePerMm: number;
  resistance: number;
  /** What the reader of these numbers has to know about this weld. */
  notes: string[];
}

/**
 * Design resistance of a fillet weld with equal legs.
 *
 * Along: fu / (√3·βw·γM2)·a for each mm. Directional, load in the plane of a leg at θ to the weld: σ⊥ = τ⊥ =
 * F·sinθ / (√2·a), τ∥ = F·cosθ / a, so that F = fu·a / (βw·γM2·√(2 + cos²θ)).
 *
 * The second condition, σ⊥ ≤ 0.9·fu/γM2, cannot govern while βw ≥ 0.8.
 *
 * @param inputs parsed by `filletWeldInputs`
 * @returns fails on `leg` when neither size is given, on `throat` when both are, and on `length` when the weld is too
 * short to carry load
 * @see EN 1993-1-8:2005, 4.5.3.2 and 4.5.3.3
 */
export function filletWeld(inputs: FilletWeldInputs): Result<FilletWeldResults, CalculatorIssue> {
  const size = sizeOf(inputs);
  if (!size.ok) return size;
  const { throat, leg } = size.value;
  const shortest = Math.max(30, 6 * throat);
  if (inputs.length < shortest - 1e-9) {
    const message = `A fillet weld this short carries no load in EN 1993-1-8, 4.5.1: make it at least ${Math.ceil(shortest * 10) / 10} mm long (30 mm or six throats).`;
    return fail({ field: "length", message });
  }
  const angleFactor = inputs.method === "directional" ? directional(inputs.loadAngle) : 1;
  const strength = inputs.ultimate / (Math.sqrt(3) * inputs.correlation * inputs.gammaM2);
  const resistancePerMm = strength * throat * angleFactor;
  return ok({
    throat,
    leg,
    angleFactor,
    resistancePerMm,
    resistance: resistancePerMm * inputs.length,
    notes: notes(throat, inputs.length),
  });
}

function directional(loadAngle: number): number {
  return Math.sqrt(3 / (2 + Math.cos((loadAngle * Math.PI) / 180) ** 2));
}

function sizeOf({ leg, throat }: FilletWeldInputs): Result<{ leg: number; throat: number }, CalculatorIssue> {
  if (leg !== undefined && throat !== undefined) {
    return fail({ field: "throat", message: "Give the leg or the throat, not both: leave one out." });
  }
  if (leg !== undefined) return ok({ leg, throat: leg / Math.SQRT2 });
  if (throat !== undefined) return ok({ leg: throat * Math.SQRT2, throat });
  return fail({ field: "leg", message: "Give the size of the weld: its leg or its throat, in mm." });
}

function notes(throat: number, length: number): string[] {
  const said: string[] = [];
  if (throat < 3 - 1e-9) {
    said.push("The throat is below 3 mm, the least that EN 1993-1-8, 4.5.2, lets carry load in steelwork.");
  }
  if (length > 150 * throat) {
    said.push(
      "In a lap joint longer than 150 throats the ends tear first: EN 1993-1-8, 4.11, reduces the resistance.",
    );
  }
  return said;
}
