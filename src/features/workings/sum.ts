import type { CalculatorDefinition, CalculatorIssue } from "#shared/calculators/definition.ts";
import type { InputField } from "#shared/calculators/inputs.ts";
import { type CalculatorRun, runCalculator } from "#shared/calculators/registry.ts";
import { fail, type Result } from "#shared/result.ts";
import { formatLength, type LengthUnits, parseFigure, parseLength, toInches } from "#shared/units/length.ts";

/** What stands in each field, as typed. */
export type Typed = Record<string, string>;

type NumberField = Extract<InputField, { kind: "number" }>;

const isLength = (field: NumberField) => field.unit === "mm";

/** The unit stamped on a field for this person. */
export function unitOf(field: NumberField, units: LengthUnits): string {
  return isLength(field) && units === "inch" ? "in" : field.unit;
}

/** Inputs as a person would have typed them; enough decimals in inches to give back the same hundredth of a mm. */
export function typedFrom(
  definition: CalculatorDefinition,
  inputs: Record<string, unknown>,
  units: LengthUnits,
): Typed {
  return Object.fromEntries(
    definition.fields.map((field) => {
      const value = inputs[field.name] ?? field.default;
      if (typeof value !== "number") return [field.name, value === undefined ? "" : String(value)];
      const shown =
        field.kind === "number" && isLength(field) && units === "inch"
          ? Number(toInches(value).toFixed(4))
          : value;
      return [field.name, String(shown)];
    }),
  );
}

/**
 * Works the sum from what is typed; the first fault is told in the person's own unit.
 *
 * @param kept numbers that fields hold unchanged, so that going through inches and back does not shift them
 */
export function workTyped(
  definition: CalculatorDefinition,
  typed: Typed,
  units: LengthUnits,
  kept: Record<string, unknown>,
): Result<CalculatorRun, CalculatorIssue> {
  const untouched = typedFrom(definition, kept, units);
  const inputs: Record<string, unknown> = {};
  for (const field of definition.fields) {
    const text = typed[field.name] ?? "";
    if (text === untouched[field.name] && kept[field.name] !== undefined) {
      inputs[field.name] = kept[field.name];
      continue;
    }
    if (text.trim() === "" && field.optional) continue;
    const read = readField(field, text, units);
    if (!read.ok) return read;
    inputs[field.name] = read.value;
  }
  return runCalculator(definition.id, inputs);
}

function readField(
  field: InputField,
  text: string,
  units: LengthUnits,
): Result<number | string, CalculatorIssue> {
  if (field.kind !== "number") return { ok: true, value: text };
  const read = isLength(field) ? parseLength(text, units) : readFigure(text);
  if (!read.ok)
    return fail({ field: field.name, message: `${field.label}: ${lowerFirst(read.issue.message)}` });
  if (read.value >= field.min && read.value <= field.max) return read;
  const show = (limit: number) =>
    isLength(field)
      ? formatLength(limit, units, field.decimals)
      : `${limit}${field.unit === "°" ? "°" : ` ${field.unit}`}`.trim();
  const message = `${field.label} must be between ${show(field.min)} and ${show(field.max)}.`;
  return fail({ field: field.name, message });
}

function readFigure(text: string): Result<number, { message: string }> {
  const value = parseFigure(text);
  return value === undefined ? fail({ message: "Type a number, such as 60." }) : { ok: true, value };
}

const lowerFirst = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);

/** One press of an arrow key: the field's own step, or a 64th of an inch. */
export function stepped(
  field: NumberField,
  text: string,
  units: LengthUnits,
  presses: number,
): string | undefined {
  const read = isLength(field) ? parseLength(text, units) : readFigure(text);
  if (!read.ok) return undefined;
  const inInches = isLength(field) && units === "inch";
  const value = inInches ? toInches(read.value) + presses / 64 : read.value + presses * field.step;
  const [low, high] = inInches ? [toInches(field.min), toInches(field.max)] : [field.min, field.max];
  return String(Number(Math.min(high, Math.max(low, value)).toFixed(inInches ? 6 : 4)));
}
