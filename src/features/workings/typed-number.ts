import type { InputField } from "#shared/calculators/inputs.ts";
import { fail, ok, type Result } from "#shared/result.ts";
import { formatLength, fromInches, type LengthUnits, parseFigure, toInches } from "#shared/units/length.ts";
import { workArithmetic } from "./arithmetic.ts";

export type NumberField = Extract<InputField, { kind: "number" }>;

export const isLength = (field: NumberField) => field.unit === "mm";

/** The unit stamped on a field for this person. */
export function unitOf(field: NumberField, units: LengthUnits): string {
  return isLength(field) && units === "inch" ? "in" : field.unit;
}

/** A number as the field shows it; in inches with enough decimals to give back the same hundredth of a mm. */
export function shownNumber(field: NumberField, value: number, units: LengthUnits): string {
  return String(isLength(field) && units === "inch" ? Number(toInches(value).toFixed(4)) : value);
}

/** Reads a number as people type it, sums and fractions included; a unit that is typed goes before the person's own. */
export function readTypedNumber(
  field: NumberField,
  text: string,
  units: LengthUnits,
): Result<number, { message: string }> {
  const [, bare = "", typed = ""] = /^(.*?)\s*(mm|cm|inch|in|"|″|°|)\s*$/iu.exec(text.trim()) ?? [];
  const unit = typed.toLowerCase();
  const fits = unit === "" || (unit === "°" ? field.unit === "°" : isLength(field));
  const figure = fits ? (parseFigure(bare) ?? workArithmetic(bare)) : undefined;
  if (figure === undefined) {
    const example = !isLength(field) ? "60 or 48/2" : units === "mm" ? "38.1 or 48.3/2" : "1.5 or 1 1/2";
    return fail({ message: `Type a number, such as ${example}.` });
  }
  if (!isLength(field)) return ok(figure);
  if (unit === "cm") return ok(figure * 10);
  return ok((unit || units) === "mm" ? figure : fromInches(figure));
}

/** What a sum, a fraction or another unit came to; nothing for a plain number, which needs no telling. */
export function understood(field: NumberField, text: string, units: LengthUnits): string | undefined {
  if (/^\s*[+-]?[\d.,]*\s*$/.test(text)) return undefined;
  const read = readTypedNumber(field, text, units);
  if (!read.ok) return undefined;
  const tidy = (value: number) => String(Number(value.toFixed(4)));
  if (!isLength(field))
    return `= ${tidy(read.value)}${field.unit === "°" ? "°" : ` ${field.unit}`}`.trimEnd();
  return units === "mm"
    ? `= ${tidy(read.value)} mm`
    : `= ${tidy(toInches(read.value))} in (${formatLength(read.value, "mm", 2)})`;
}

/** One press of an arrow key: the field's own step, or a 64th of an inch. */
export function stepped(
  field: NumberField,
  text: string,
  units: LengthUnits,
  presses: number,
): string | undefined {
  const read = readTypedNumber(field, text, units);
  if (!read.ok) return undefined;
  const inInches = isLength(field) && units === "inch";
  const value = inInches ? toInches(read.value) + presses / 64 : read.value + presses * field.step;
  const [low, high] = inInches ? [toInches(field.min), toInches(field.max)] : [field.min, field.max];
  return String(Number(Math.min(high, Math.max(low, value)).toFixed(inInches ? 6 : 4)));
}
