import type { z } from "zod";
import { fail, ok, type Result } from "#shared/result.ts";
import type { TemplateNames, TemplateSheet } from "#shared/templates/sheet.ts";
import { bolt } from "./bolt/definition.ts";
import { cornerWeightsCalculator } from "./corner-weights/definition.ts";
import type { CalculatorDefinition, CalculatorIssue } from "./definition.ts";
import { filletWeld } from "./fillet-weld/definition.ts";
import { mitre } from "./mitre/definition.ts";
import { saddleCope } from "./saddle-cope/definition.ts";
import { sheetBend } from "./sheet-bend/definition.ts";
import { springRideCalculator } from "./spring-ride/definition.ts";
import { steeringAxisCalculator } from "./steering-axis/definition.ts";
import { stockCuttingCalculator } from "./stock-cutting/definition.ts";
import { strut } from "./strut/definition.ts";
import { strutCurve } from "./strut-curve/definition.ts";
import { tapDrill } from "./tap-drill/definition.ts";
import { tubeBendCalculator } from "./tube-bend/definition.ts";
import { tubePiece } from "./tube-piece/definition.ts";
import { tubeSection } from "./tube-section/definition.ts";
import { wishboneTravelCalculator } from "./wishbone-travel/definition.ts";

/** Every calculator, in the order the bench lists them. A new one is added here and nowhere else. */
export const calculators: readonly CalculatorDefinition[] = [
  saddleCope,
  tubePiece,
  mitre,
  steeringAxisCalculator,
  wishboneTravelCalculator,
  springRideCalculator,
  cornerWeightsCalculator,
  tubeSection,
  strut,
  strutCurve,
  filletWeld,
  bolt,
  tubeBendCalculator,
  sheetBend,
  tapDrill,
  stockCuttingCalculator,
];

/** Ids as used in the address, the API and the command line. */
export const calculatorIds: readonly string[] = calculators.map((calculator) => calculator.id);

/** A calculator by id; `undefined` when there is none of that name. */
export function findCalculator(id: string): CalculatorDefinition | undefined {
  return calculators.find((calculator) => calculator.id === id);
}

/** A finished sum, as it is kept with a working: inputs with their defaults filled in, and what came out. */
export interface CalculatorRun {
  calculator: string;
  version: number;
  inputs: Record<string, unknown>;
  results: object;
}

/**
 * Checks raw inputs and works the sum: the one way in for browser, server, API and command line.
 *
 * @returns the first fault found, naming its field, when the inputs do not make sense; an unknown id is
 * reported on the field `calculator`
 */
export function runCalculator(id: string, rawInputs: unknown): Result<CalculatorRun, CalculatorIssue> {
  const definition = findCalculator(id);
  if (!definition) {
    return fail({ field: "calculator", message: `There is no calculator called "${id}".` });
  }
  const parsed = definition.inputs.safeParse(rawInputs);
  if (!parsed.success) return fail(firstIssue(parsed.error));
  const computed = definition.compute(parsed.data);
  if (!computed.ok) return computed;
  return ok({
    calculator: definition.id,
    version: definition.version,
    inputs: parsed.data,
    results: computed.value,
  });
}

/**
 * The full-size sheet of a finished sum; `undefined` when this calculator has none.
 *
 * @param run as `runCalculator` gave it, so that inputs and results belong together
 */
export function templateOf(run: CalculatorRun, names: TemplateNames): TemplateSheet | undefined {
  return findCalculator(run.calculator)?.template?.(run.inputs, run.results, names);
}

function firstIssue(error: z.ZodError): CalculatorIssue {
  const [issue] = error.issues;
  if (!issue) return { field: "inputs", message: "The inputs could not be read." };
  if (issue.code === "unrecognized_keys") {
    const field = [...issue.path, issue.keys[0]].join(".");
    return { field, message: `There is no input called "${field}" here.` };
  }
  if (issue.path.length === 0) {
    return { field: "inputs", message: "Give the inputs as a JSON object, one name for each input." };
  }
  return { field: issue.path.join("."), message: issue.message };
}
