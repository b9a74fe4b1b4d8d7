import { fail, ok, type Result } from "#shared/result.ts";

/** Which units a person reads and types lengths in; calculators and the database only ever hold mm. */
export type LengthUnits = "mm" | "inch";

/** Exactly 25.4 mm, by definition (ISO 80000-3; international yard agreement of 1959). */
export const millimetresPerInch = 25.4;

/** mm to inches. */
export function toInches(millimetres: number): number {
  return millimetres / millimetresPerInch;
}

/** Inches to mm. */
export function fromInches(inches: number): number {
  return inches * millimetresPerInch;
}

/**
 * A length for the screen, without its unit: decimals as asked in mm, two more in inches (0.1 mm is about 0.004 in).
 *
 * @param decimals in mm
 */
export function lengthFigure(millimetres: number, units: LengthUnits, decimals: number): string {
  const value = units === "mm" ? millimetres : toInches(millimetres);
  const figure = value.toFixed(units === "mm" ? decimals : decimals + 2);
  return Number(figure) === 0 ? figure.replace("-", "") : figure;
}

/** A length for the screen with its unit: `12.7 mm`, `0.500 in`. */
export function formatLength(millimetres: number, units: LengthUnits, decimals = 1): string {
  return `${lengthFigure(millimetres, units, decimals)} ${units === "mm" ? "mm" : "in"}`;
}

/**
 * The nearest fraction of an inch, as on a rule: `1 1/2`, `3/8`, `0`.
 *
 * @param denominator finest division of the rule: a power of two
 * @returns the words and how much longer the fraction is than the length itself, in mm
 */
export function inchFraction(millimetres: number, denominator = 32): { text: string; excess: number } {
  const parts = Math.round(toInches(Math.abs(millimetres)) * denominator);
  const sign = millimetres < 0 && parts > 0 ? "−" : "";
  const whole = Math.floor(parts / denominator);
  let top = parts % denominator;
  let under = denominator;
  while (top > 0 && top % 2 === 0) {
    top /= 2;
    under /= 2;
  }
  const fraction = top === 0 ? "" : `${top}/${under}`;
  const text = `${sign}${[whole > 0 || top === 0 ? String(whole) : "", fraction].filter(Boolean).join(" ")}`;
  const excess = Math.sign(millimetres) * fromInches(parts / denominator) - millimetres;
  return { text, excess };
}

const decimal = /^[+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)$/;
const fraction = /^([+-]?)(?:(\d+)[\s-]+)?(\d+)\s*\/\s*(\d+)$/;

/**
 * Reads a length as people type it: `12.5`, `12,5`, `1 1/2`, `1-1/2"`, `3/8 in`, `40 mm`. A unit that is typed goes
 * before the person's own.
 *
 * @returns mm; fails with a message when it cannot be read
 */
export function parseLength(text: string, units: LengthUnits): Result<number, { message: string }> {
  const [, bare = "", typed = ""] = /^(.*?)\s*(mm|cm|inch|in|"|″|)\s*$/iu.exec(normalise(text)) ?? [];
  const figure = parseFigure(bare);
  if (figure === undefined) {
    const example = units === "mm" ? "38.1" : "1.5 or 1 1/2";
    return fail({ message: `Type a number, such as ${example}.` });
  }
  const unit = typed.toLowerCase() || units;
  if (unit === "mm") return ok(figure);
  return ok(unit === "cm" ? figure * 10 : fromInches(figure));
}

function normalise(text: string): string {
  return text.trim().replace(/[−–]/g, "-").replace(/⁄/g, "/");
}

/** A plain number with a dot or a comma, or a fraction; `undefined` when it is neither. */
export function parseFigure(text: string): number | undefined {
  const bare = normalise(text);
  if (decimal.test(bare)) return Number(bare.replace(",", "."));
  const [, sign, whole = "0", top, under] = fraction.exec(bare) ?? [];
  if (top === undefined || Number(under) === 0) return undefined;
  return (sign === "-" ? -1 : 1) * (Number(whole) + Number(top) / Number(under));
}
