import type { LengthUnits } from "#shared/units/length.ts";

/** What every drawing of a working is given. */
export interface DrawingProps<Inputs = Record<string, unknown>, Results = object> {
  inputs: Inputs;
  results: Results;
  units: LengthUnits;
}
