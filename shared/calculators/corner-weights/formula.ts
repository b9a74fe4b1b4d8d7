import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { CornerWeightsInputs } from "./inputs.ts";

/** Results of `corner-weights`: kg, percent, mm. */
export interface CornerWeightsResults {
  total: number;
  frontPercent: number;
  leftPercent: number;
  /** Right front and left rear together. */
  crossPercent: number;
  /** Centre of gravity behind the front axle. */
  cgFromFront: number;
  /** Centre of gravity to the left of the centreline; negative: to the right (ISO 8855: y is left). */
  cgFromCentre: number;
  /** Centre of gravity above the ground; null without a second weighing. */
  cgHeight: number | null;
  /** What moves to the front scales when the rear is raised; null without a second weighing. */
  massMoved: number | null;
  /** Diagonals compared: what the right front and left rear carry more than the others. */
  crossDifference: number;
}

/**
 * Balance of a car on four scales.
 *
 * @param inputs parsed by `cornerWeightsInputs`
 * @returns fails on `lf` when the scales show nothing, on `lifted.height` when the rear is raised past what the
 * wheelbase allows, and on `lifted.frontMass` when the second weighing does not fit the first
 */
export function cornerWeights(inputs: CornerWeightsInputs): Result<CornerWeightsResults, CalculatorIssue> {
  const { lf, rf, lr, rr, wheelbase, frontTrack, rearTrack } = inputs;
  const total = lf + rf + lr + rr;
  if (total < 1)
    return fail({ field: "lf", message: "The scales show nothing: together they must read at least 1 kg." });
  const height = cgHeight(inputs, total);
  if (!height.ok) return height;
  return ok({
    total,
    frontPercent: (100 * (lf + rf)) / total,
    leftPercent: (100 * (lf + lr)) / total,
    crossPercent: (100 * (rf + lr)) / total,
    cgFromFront: ((lr + rr) * wheelbase) / total,
    cgFromCentre: ((lf - rf) * frontTrack + (lr - rr) * rearTrack) / 2 / total,
    ...height.value,
    crossDifference: rf + lr - lf - rr,
  });
}

type Height = Pick<CornerWeightsResults, "cgHeight" | "massMoved">;

/**
 * Height of the centre of gravity from a second weighing with the rear axle raised.
 *
 * height = loaded radius + wheelbase·Δm / (total·tan θ), sin θ = raised / wheelbase.
 */
function cgHeight(
  { lf, rf, wheelbase, lifted }: CornerWeightsInputs,
  total: number,
): Result<Height, CalculatorIssue> {
  if (!lifted) return ok({ cgHeight: null, massMoved: null });
  const most = 0.8 * wheelbase;
  if (lifted.height > most) {
    return fail({
      field: "lifted.height",
      message: `The rear cannot be raised so far: keep it within ${Math.floor(most)} mm, four fifths of the wheelbase.`,
    });
  }
  const { frontMass } = lifted;
  if (frontMass >= total) {
    const message = `The front scales cannot carry the whole car: they must read less than ${total} kg together.`;
    return fail({ field: "lifted.frontMass", message });
  }
  const massMoved = frontMass - lf - rf;
  const tangent = Math.tan(Math.asin(lifted.height / wheelbase));
  const height = lifted.loadedRadius + (wheelbase * massMoved) / (total * tangent);
  if (height <= 0) {
    const least = lf + rf - (lifted.loadedRadius * total * tangent) / wheelbase;
    const message = `This would put the centre of gravity below the ground: the front scales must read more than ${Math.max(0, least).toFixed(1)} kg together with the rear raised. On the level they read ${lf + rf} kg.`;
    return fail({ field: "lifted.frontMass", message });
  }
  return ok({ cgHeight: height, massMoved });
}
