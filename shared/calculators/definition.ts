import type { z } from "zod";
import type { Result } from "#shared/result.ts";
import type { TemplateNames, TemplateSheet } from "#shared/templates/sheet.ts";
import { describeInputs, type InputField } from "./inputs.ts";

/** Why a calculator gave no results. `field` is the input's name; nested ones are joined by dots (`ends.0.angle`). */
export interface CalculatorIssue {
  field: string;
  message: string;
}

/**
 * One result that is shown as a row of the results table.
 *
 * `name` is its path in the results (`sideDepth.at90`). Results that are not plain numbers (a curve, a list of steps)
 * are not listed here: the drawing and the panel show those.
 */
export interface ResultField {
  name: string;
  label: string;
  /** Printed as given; "mm" is turned into inches on the screen of a person who works in inches. */
  unit: string;
  decimals: number;
  meaning: string;
  /** Shown large beside the drawing. When none is marked, the first rows are. */
  headline?: true;
  /** Heading over a run of rows that belong together; the first rows need none. */
  section?: string;
}

/** How a result is worked out, for the reader who wants to check it. */
export interface Method {
  /** Formula lines, in plain text. */
  formula: readonly string[];
  explanation: string;
  sources: readonly string[];
}

/** Everything the site knows about a calculator. Screens, command line and API are made from this alone. */
export interface CalculatorDefinition<
  Schema extends z.ZodObject = z.ZodObject,
  Results extends object = object,
> {
  id: string;
  /** Raised when a result can change for the same inputs. */
  version: number;
  name: string;
  purpose: string;
  /** Heading on the bench under which it is listed. */
  group: string;
  /** What else a fabricator might type to find it. */
  words: readonly string[];
  inputs: Schema;
  fields: readonly InputField[];
  /** Inputs of a worked example; those with a default may be left out. */
  example: z.input<Schema>;
  compute(inputs: z.output<Schema>): Result<Results, CalculatorIssue>;
  /** A full-size sheet to mark steel with, for those calculators that have one. */
  template?(inputs: z.output<Schema>, results: Results, names: TemplateNames): TemplateSheet;
  /** What a person does at the bench, one sentence a step; `show` writes a length given in mm. */
  steps?(inputs: z.output<Schema>, results: Results, show: (millimetres: number) => string): string[];
  resultFields: readonly ResultField[];
  cautions: readonly string[];
  method: Method;
}

/** Completes a definition: the field descriptions come from the schema, so that they cannot disagree with it. */
export function defineCalculator<Schema extends z.ZodObject, Results extends object>(
  definition: Omit<CalculatorDefinition<Schema, Results>, "fields">,
): CalculatorDefinition<Schema, Results> {
  return { ...definition, fields: describeInputs(definition.inputs) };
}
