import { useState } from "react";
import type { CalculatorDefinition, CalculatorIssue } from "#shared/calculators/definition.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { type Typed, typedFrom, workTyped } from "./sum.ts";

interface Numbers {
  inputs: Record<string, unknown>;
  results: object;
}

interface SumState {
  /** The kept inputs this began from, as JSON. */
  from: string;
  units: LengthUnits;
  typed: Typed;
  shown: Numbers;
  issue: CalculatorIssue | null;
}

/**
 * The sum while it is being changed: what is typed, the last numbers that worked, and what is wrong now.
 *
 * @param begunWith what stands in the fields at first, in place of the kept inputs
 */
export function useWorkingSum(
  definition: CalculatorDefinition,
  kept: Numbers,
  units: LengthUnits,
  onInputsChange?: (inputs: Record<string, unknown>) => void,
  begunWith?: Typed,
) {
  const from = JSON.stringify(kept.inputs);
  const fresh = (): SumState => ({
    from,
    units,
    typed: typedFrom(definition, kept.inputs, units),
    shown: kept,
    issue: null,
  });
  const [stored, setState] = useState(() => (begunWith ? worked(begunWith, kept) : fresh()));
  const state = follow(stored);

  /** Takes over what changed outside: other units, or numbers that this panel did not send itself (an undo). */
  function follow(before: SumState): SumState {
    if (before.from !== from && JSON.stringify(before.shown.inputs) !== from) return fresh();
    if (before.units === units) return before;
    return { ...before, units, typed: typedFrom(definition, before.shown.inputs, units), issue: null };
  }

  const first = typedFrom(definition, kept.inputs, units);

  /** The sum of what is typed; while that does not work the numbers before stay shown. */
  function worked(typed: Typed, before: Numbers): SumState {
    const run = workTyped(definition, typed, units, before.inputs);
    return {
      from,
      units,
      typed,
      shown: run.ok ? run.value : before,
      issue: run.ok ? null : run.issue,
    };
  }

  const change = (typed: Typed) => {
    const next = worked(typed, state.shown);
    setState(next);
    if (!next.issue) onInputsChange?.(next.shown.inputs);
  };

  return {
    typed: state.typed,
    shown: state.shown,
    issue: state.issue,
    changed: Object.keys({ ...first, ...state.typed }).some((name) => first[name] !== state.typed[name]),
    change,
    putBack: () => {
      setState(fresh());
      onInputsChange?.(kept.inputs);
    },
  };
}
