import type { CalculatorDefinition, CalculatorIssue } from "#shared/calculators/definition.ts";
import type { InputField } from "#shared/calculators/inputs.ts";
import { type CalculatorRun, runCalculator } from "#shared/calculators/registry.ts";
import { fail, ok, type Result } from "#shared/result.ts";
import { formatLength, type LengthUnits } from "#shared/units/length.ts";
import { isLength, type NumberField, readTypedNumber, shownNumber } from "./typed-number.ts";

/**
 * What stands in each field, as typed, by the input's dotted name (`ends.0.angle`). A list also has its length under
 * its own name, and an optional group "on" or nothing. The same names stand in a link that carries the sum.
 */
export type Typed = Record<string, string>;

/** Most items of a list that an address may ask for. */
const mostItems = 200;

export const countOf = (typed: Typed, path: string) =>
  Math.min(mostItems, Math.max(0, Math.trunc(Number(typed[path])) || 0));

/** Groups and points that may be left out are switched on first: their own fields cannot tell empty from left out. */
export const isSwitched = (field: InputField) =>
  (field.kind === "group" || field.kind === "point") && field.optional && field.default === undefined;

/** Inputs as a person would have typed them. */
export function typedFrom(
  definition: Pick<CalculatorDefinition, "fields">,
  inputs: Record<string, unknown>,
  units: LengthUnits,
): Typed {
  return Object.assign(
    {},
    ...definition.fields.map((field) => typedOf(field, inputs[field.name], field.name, units)),
  );
}

/** One field and all below it. */
export function typedOf(field: InputField, given: unknown, path: string, units: LengthUnits): Typed {
  const value = given ?? field.default;
  switch (field.kind) {
    case "number":
      return { [path]: typeof value === "number" ? shownNumber(field, value, units) : "" };
    case "point": {
      const axes = Array.isArray(value) ? value : [];
      return Object.assign(
        isSwitched(field) ? { [path]: value === undefined ? "" : "on" } : {},
        ...field.axes.map((axis, index) => typedOf(axis, axes[index], `${path}.${index}`, units)),
      );
    }
    case "group": {
      const parts = (value ?? {}) as Record<string, unknown>;
      return Object.assign(
        isSwitched(field) ? { [path]: value === undefined ? "" : "on" } : {},
        ...field.fields.map((part) => typedOf(part, parts[part.name], `${path}.${part.name}`, units)),
      );
    }
    case "list": {
      // A single value is short for a list of one.
      const items = Array.isArray(value) ? value : value === undefined ? [] : [value];
      return Object.assign(
        { [path]: String(items.length) },
        ...items.map((item, index) => typedOf(field.item, item, `${path}.${index}`, units)),
      );
    }
    default:
      return { [path]: value === undefined ? "" : String(value) };
  }
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
  const inputs: Record<string, unknown> = {};
  for (const field of definition.fields) {
    const read = readField(field, { typed, units, path: field.name, kept: kept[field.name] });
    if (!read.ok) return read;
    if (read.value !== undefined) inputs[field.name] = read.value;
  }
  return runCalculator(definition.id, inputs);
}

interface Reading {
  typed: Typed;
  units: LengthUnits;
  path: string;
  kept: unknown;
}

function readField(field: InputField, reading: Reading): Result<unknown, CalculatorIssue> {
  const { typed, path, kept } = reading;
  const text = typed[path] ?? "";
  if (isSwitched(field) && text === "") return ok(undefined);
  switch (field.kind) {
    case "number":
      return readNumber(field, text, reading);
    case "switch":
      return ok(text === "" && field.optional ? undefined : text === "true");
    case "point":
      return readList(field.axes, reading);
    case "group":
      return readGroup(field.fields, reading);
    case "list": {
      const count = countOf(typed, path);
      const items = Array.from({ length: count }, () => field.item);
      if (count === 1 && field.single) {
        const alone = Array.isArray(kept) ? kept[0] : kept;
        return readField(field.item, { ...reading, path: `${path}.0`, kept: alone });
      }
      return count === 0 && field.optional ? ok(undefined) : readList(items, reading);
    }
    default:
      return ok(text === "" && field.optional ? undefined : text);
  }
}

function readList(fields: readonly InputField[], reading: Reading): Result<unknown[], CalculatorIssue> {
  const kept = Array.isArray(reading.kept) ? reading.kept : [];
  const values: unknown[] = [];
  for (const [index, field] of fields.entries()) {
    const read = readField(field, { ...reading, path: `${reading.path}.${index}`, kept: kept[index] });
    if (!read.ok) return read;
    values.push(read.value);
  }
  return ok(values);
}

function readGroup(fields: readonly InputField[], reading: Reading): Result<unknown, CalculatorIssue> {
  const kept = (reading.kept ?? {}) as Record<string, unknown>;
  const values: Record<string, unknown> = {};
  for (const field of fields) {
    const path = `${reading.path}.${field.name}`;
    const read = readField(field, { ...reading, path, kept: kept[field.name] });
    if (!read.ok) return read;
    if (read.value !== undefined) values[field.name] = read.value;
  }
  return ok(values);
}

function readNumber(field: NumberField, text: string, reading: Reading): Result<unknown, CalculatorIssue> {
  const { units, path, kept } = reading;
  if (typeof kept === "number" && text === shownNumber(field, kept, units)) return ok(kept);
  if (text.trim() === "" && field.optional) return ok(undefined);
  const read = readTypedNumber(field, text, units);
  if (!read.ok) return fail({ field: path, message: `${field.label}: ${lowerFirst(read.issue.message)}` });
  if (read.value >= field.min && read.value <= field.max) return read;
  const show = (limit: number) =>
    isLength(field)
      ? formatLength(limit, units, field.decimals)
      : `${limit}${field.unit === "°" ? "°" : ` ${field.unit}`}`.trim();
  const message = `${field.label} must be between ${show(field.min)} and ${show(field.max)}.`;
  return fail({ field: path, message });
}

const lowerFirst = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
