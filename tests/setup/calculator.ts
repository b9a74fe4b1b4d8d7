import { findCalculator, runCalculator } from "#shared/calculators/registry.ts";

/** Results of a sum that works; a sum that does not fails the test with its message. */
export function resultsOf<Results extends object>(id: string, inputs: unknown): Results {
  const run = runCalculator(id, inputs);
  if (!run.ok) throw new Error(`${run.issue.field}: ${run.issue.message}`);
  return run.value.results as Results;
}

/** The fault of a sum that does not work; `undefined` when it does. */
export function issueOf(id: string, inputs: unknown) {
  const run = runCalculator(id, inputs);
  return run.ok ? undefined : run.issue;
}

/** Every number in a value, however deep. */
export function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  if (value !== null && typeof value === "object") return Object.values(value).flatMap(numbersIn);
  return [];
}

/** Whether every number in a value is finite. Plain loops: it runs ten thousand times. */
export function allFinite(value: unknown): boolean {
  if (typeof value === "number") return Number.isFinite(value);
  if (value === null || typeof value !== "object") return true;
  for (const part of Object.values(value)) if (!allFinite(part)) return false;
  return true;
}

/** Names of result fields that a definition lists but its results lack, or that are no plain number. */
export function missingResultFields(id: string): string[] {
  const definition = findCalculator(id);
  if (!definition) throw new Error(`No calculator ${id}`);
  const results = resultsOf(id, definition.example);
  return definition.resultFields
    .map(({ name }) => name)
    .filter((name) => {
      const value = name
        .split(".")
        .reduce<unknown>(
          (part, key) =>
            part !== null && typeof part === "object"
              ? Object.entries(part).find(([own]) => own === key)?.[1]
              : undefined,
          results,
        );
      return typeof value !== "number";
    });
}
