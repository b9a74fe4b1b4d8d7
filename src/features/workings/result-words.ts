import type { ResultField } from "#shared/calculators/definition.ts";
import { type LengthUnits, lengthFigure } from "#shared/units/length.ts";

/** A result by its dotted name; `undefined` when this version of the sum did not give it. */
export function resultAt(results: object, name: string): number | undefined {
  const value = name
    .split(".")
    .reduce<unknown>((at, key) => (at as Record<string, unknown> | undefined)?.[key], results);
  return typeof value === "number" ? value : undefined;
}

/** A result as shown: figure and unit. */
export function resultWords({ name, unit, decimals }: ResultField, results: object, units: LengthUnits) {
  const value = resultAt(results, name);
  if (value === undefined) return undefined;
  if (unit === "mm")
    return { figure: lengthFigure(value, units, decimals), unit: units === "mm" ? "mm" : "in" };
  return { figure: value.toFixed(decimals), unit };
}

/** The results a person looks for first. */
export function headlinesOf(fields: readonly ResultField[]): readonly ResultField[] {
  const marked = fields.filter((field) => field.headline);
  return marked.length > 0 ? marked : fields.filter((field) => !field.section).slice(0, 6);
}
