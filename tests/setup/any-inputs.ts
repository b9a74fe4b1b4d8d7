import fc from "fast-check";
import type { z } from "zod";
import type { InputField } from "#shared/calculators/inputs.ts";
import { findCalculator, runCalculator } from "#shared/calculators/registry.ts";
import { allFinite } from "./calculator.ts";

/**
 * Numbers of a range: even steps that reach both ends, the small ones by ratio too, since a wall is small in a range
 * made for the largest tube.
 */
export function inRange(min: number, max: number): fc.Arbitrary<number> {
  const even = fc.integer({ min: 0, max: 1000 }).map((step) => min + ((max - min) * step) / 1000);
  if (min <= 0) return even;
  const byRatio = fc
    .integer({ min: 0, max: 1000 })
    .map((step) => Math.min(max, min * (max / min) ** (step / 1000)));
  return fc.oneof(even, byRatio);
}

function anyField(field: InputField): fc.Arbitrary<unknown> {
  switch (field.kind) {
    case "number":
      return field.decimals === 0 && field.unit === ""
        ? wholeOrAny(field.min, field.max)
        : inRange(field.min, field.max);
    case "choice":
      return fc.constantFrom(...field.choices.map(({ value }) => value));
    case "switch":
      return fc.boolean();
    case "group":
      return anyFields(field.fields);
    case "text":
      return fc.string({ maxLength: field.maxLength });
    case "point":
      return fc.tuple(...field.axes.map(anyField));
    case "list":
      return fc.array(anyField(field.item), { minLength: 1, maxLength: 4 });
  }
}

const wholeOrAny = (min: number, max: number) => fc.integer({ min: Math.ceil(min), max: Math.floor(max) });

function anyFields(fields: readonly InputField[]): fc.Arbitrary<Record<string, unknown>> {
  const parts = Object.fromEntries(fields.map((field) => [field.name, anyField(field)]));
  const requiredKeys = fields.filter(({ optional }) => !optional).map(({ name }) => name);
  return fc.record(parts, { requiredKeys });
}

/** Inputs within the limits that a calculator's own fields declare; whether they fit together is left to chance. */
export function anyInputs(id: string): fc.Arbitrary<Record<string, unknown>> {
  const definition = findCalculator(id);
  if (!definition) throw new Error(`No calculator ${id}`);
  return anyFields(definition.fields);
}

interface Tally {
  worked: number;
  /** Fields that were named as the fault, with how often. */
  faults: Map<string, number>;
}

/**
 * Runs a calculator on many inputs that its schema lets through and throws at the first result that holds NaN or
 * Infinity, or fault without a field or a readable message.
 *
 * @returns how many worked and which fields were faulted, so that the test can say that both were reached
 */
export function runMany(id: string, inputs: fc.Arbitrary<Record<string, unknown>>, numRuns = 10_000): Tally {
  const schema: z.ZodType | undefined = findCalculator(id)?.inputs;
  const tally: Tally = { worked: 0, faults: new Map() };
  fc.assert(
    fc.property(inputs, (raw) => {
      fc.pre(schema?.safeParse(raw).success ?? false);
      const run = runCalculator(id, raw);
      if (run.ok) {
        tally.worked += 1;
        return allFinite(run.value.results);
      }
      const { field, message } = run.issue;
      tally.faults.set(field, (tally.faults.get(field) ?? 0) + 1);
      return field !== "" && message.length > 10 && !/NaN|Infinity|undefined/.test(message);
    }),
    { numRuns },
  );
  return tally;
}
