import type { Database } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Viewer } from "#server/http/viewer.ts";
import { inputsFromAddress } from "#shared/calculators/address.ts";
import type { CalculatorIssue } from "#shared/calculators/definition.ts";
import { type CalculatorRun, findCalculator, runCalculator } from "#shared/calculators/registry.ts";
import { findPlacedWorking, type PlacedWorking } from "./repository.ts";

/** The entry a working stands in, as far as the rule of who may read needs it. */
export interface WorkingEntry {
  id: string;
  state: "draft" | "scheduled" | "public" | "withdrawn";
}

export interface WorkingParts {
  database: Database;
  /** Whether this person may read the entry as it was published. The builder's own sight needs no asking. */
  canReadEntry(viewer: Viewer, entry: WorkingEntry): boolean;
}

/** A sum with the words that stand on its template. */
export interface TemplateSubject {
  run: CalculatorRun;
  build: string;
  working: string;
  /** Beginning of the file's name. */
  fileName: string;
}

export type WorkingService = ReturnType<typeof createWorkingService>;

/** Sums worked for anyone, and what a template of a kept working is drawn from. */
export function createWorkingService({ database, canReadEntry }: WorkingParts) {
  function work(calculator: string, inputs: unknown): CalculatorRun {
    if (!findCalculator(calculator))
      throw new AppError("not_found", `There is no calculator called "${calculator}".`);
    const run = runCalculator(calculator, inputs);
    if (!run.ok) throw badInput(run.issue);
    return run.value;
  }

  /** What this person sees of a working: the published numbers, or for its builder the draft's. */
  function seen(viewer: Viewer, placed: PlacedWorking | undefined) {
    if (placed) {
      const { working, build, entry } = placed;
      const readable = entry !== null && entry.deletedAt === null && canReadEntry(viewer, entry);
      if (readable && working.published !== null) return JSON.parse(working.published);
      if (viewer?.id === build.ownerId) return { ...working, inputs: JSON.parse(working.inputs) };
    }
    throw new AppError("not_found", "There is no such working.");
  }

  return {
    work,

    /** A kept working with some inputs changed by whoever reads it. */
    ofWorking(viewer: Viewer, id: string, changes: Changes): TemplateSubject {
      const placed = findPlacedWorking(database, id);
      const { calculator, title, inputs } = seen(viewer, placed);
      const run = work(calculator, { ...inputs, ...read(calculator, changes) });
      const name = title || findCalculator(calculator)?.name || calculator;
      return {
        run,
        build: placed?.build.title ?? "",
        working: `W${placed?.working.number} ${name}`,
        fileName: `${placed?.build.slug} w${placed?.working.number}`,
      };
    },

    /** A sum that is kept nowhere. */
    ofCalculator(calculator: string, inputs: Changes): TemplateSubject {
      const name = findCalculator(calculator)?.name ?? calculator;
      return {
        run: work(calculator, read(calculator, inputs)),
        build: "From the bench",
        working: name,
        fileName: calculator,
      };
    },
  };
}

/** Inputs as they stand in an address, by dotted name. */
type Changes = Iterable<readonly [string, unknown]>;

function read(calculator: string, pairs: Changes): Record<string, unknown> {
  return inputsFromAddress(findCalculator(calculator)?.fields ?? [], pairs);
}

function badInput({ field, message }: CalculatorIssue): AppError {
  return new AppError("invalid_input", message, { field, fields: { [field]: message } });
}
