import type { CalculatorDefinition, ResultField } from "#shared/calculators/definition.ts";
import { type LengthUnits, lengthFigure } from "#shared/units/length.ts";
import { leavesOf } from "./number-leaves.ts";
import { resultAt, resultWords } from "./result-words.ts";
import { typedFrom } from "./sum.ts";
import { unitOf } from "./typed-number.ts";

export interface Numbers {
  inputs: Record<string, unknown>;
  results: object;
}

/** One number that two sums do not share. */
export interface Difference {
  name: string;
  label: string;
  unit: string;
  first: string;
  second: string;
  /** Second less first, with its sign; nothing where that has no meaning. */
  change: string;
}

/** Items of a list that are looked at. */
const places = 40;

/** Inputs in which two sums of one calculator differ, in the person's unit. */
export function inputDifferences(
  { fields }: CalculatorDefinition,
  first: Numbers,
  second: Numbers,
  units: LengthUnits,
): Difference[] {
  const [a, b] = [typedFrom({ fields }, first.inputs, units), typedFrom({ fields }, second.inputs, units)];
  return leavesOf(fields, places)
    .filter(({ path }) => (a[path] ?? "") !== (b[path] ?? ""))
    .map(({ path, label, field }) => {
      const [before = "", after = ""] = [a[path], b[path]];
      const numbers = field.kind === "number" && before !== "" && after !== "";
      return {
        name: `input ${path}`,
        label,
        unit: field.kind === "number" ? unitOf(field, units) : "",
        first: before || "–",
        second: after || "–",
        change: numbers ? signed(Number((Number(after) - Number(before)).toFixed(4))) : "",
      };
    });
}

/** Results in which two sums differ by as much as is shown of them. */
export function resultDifferences(
  fields: readonly ResultField[],
  first: object,
  second: object,
  units: LengthUnits,
): Difference[] {
  return fields.flatMap((field): Difference[] => {
    const [before, after] = [resultWords(field, first, units), resultWords(field, second, units)];
    if (before?.figure === after?.figure) return [];
    const [a, b] = [resultAt(first, field.name), resultAt(second, field.name)];
    return [
      {
        name: `result ${field.name}`,
        label: field.label,
        unit: (after ?? before)?.unit ?? "",
        first: before?.figure ?? "–",
        second: after?.figure ?? "–",
        change: a === undefined || b === undefined ? "" : changeOf(field, b - a, units),
      },
    ];
  });
}

function changeOf({ unit, decimals }: ResultField, change: number, units: LengthUnits): string {
  const figure = unit === "mm" ? lengthFigure(change, units, decimals) : change.toFixed(decimals);
  return change > 0 ? `+${figure}` : figure.replace("-", "−");
}

const signed = (change: number) => (change > 0 ? `+${change}` : String(change).replace("-", "−"));
