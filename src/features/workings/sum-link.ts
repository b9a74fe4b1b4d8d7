import { inputsToAddress } from "#shared/calculators/address.ts";
import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import type { InputField } from "#shared/calculators/inputs.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { countOf, isSwitched, type Typed, typedFrom } from "./sum.ts";

/** The sum as the query of a link: lengths in mm, whatever the person's own unit. */
export function sumQuery(inputs: Record<string, unknown>): string {
  return new URLSearchParams(inputsToAddress(inputs)).toString();
}

/** What a link or a sent form says: the fields as typed, and the unit they are typed in. Null when it says nothing. */
export function readSumQuery(
  definition: CalculatorDefinition,
  search: URLSearchParams,
): { typed: Typed; units: LengthUnits } | null {
  // The last of several goes: a form sends a list's count first and, when a button asks for more, the new one after.
  const said = Object.fromEntries(search);
  const own = Object.entries(said).filter(([key]) =>
    definition.fields.some(({ name }) => key === name || key.startsWith(`${name}.`)),
  );
  if (own.length === 0) return null;
  const typed = {
    ...typedFrom(definition, {}, "mm"),
    ...Object.fromEntries(own),
    ...impliedBy(definition.fields, Object.fromEntries(own)),
  };
  return { typed, units: said.units === "inch" ? "inch" : "mm" };
}

/** Counts of lists and switches of groups, which a link leaves to be seen from what is in them. */
function impliedBy(fields: readonly InputField[], said: Typed): Typed {
  const implied: Typed = {};
  for (const field of fields) {
    const inside = Object.keys(said).filter((key) => key.startsWith(`${field.name}.`));
    const alone = said[field.name];
    if (isSwitched(field) && inside.length > 0) implied[field.name] = "on";
    if (field.kind !== "list") continue;
    const places = inside.map((key) => Number(key.slice(field.name.length + 1).split(".")[0]) + 1);
    if (places.length > 0) {
      implied[field.name] = String(Math.max(...places, countOf(said, field.name)));
    } else if (field.single && alone !== undefined) {
      // Without items it is no count but the one value that stands for the whole list.
      implied[field.name] = "1";
      implied[`${field.name}.0`] = alone;
    }
  }
  return implied;
}
