import type { InputField } from "#shared/calculators/inputs.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { countOf, type Typed, typedOf } from "./sum.ts";

type ListField = Extract<InputField, { kind: "list" }>;

/** One more item at the end, like the last one: most lists go on in the same way. */
export function withItem(typed: Typed, field: ListField, path: string, units: LengthUnits): Typed {
  const count = countOf(typed, path);
  const added =
    count === 0 ? typedOf(field.item, undefined, `${path}.0`, units) : moved(typed, path, count - 1, count);
  return { ...typed, ...added, [path]: String(count + 1) };
}

/** Without one item; those after it move up. */
export function withoutItem(typed: Typed, path: string, index: number): Typed {
  const count = countOf(typed, path);
  const later = Array.from({ length: count }, (_, at) => at).filter((at) => at > index);
  const shifted = later.map((at) => moved(typed, path, at, at - 1));
  const kept = Object.entries(typed).filter(([key]) => {
    const at = Number(key.startsWith(`${path}.`) ? key.slice(path.length + 1).split(".")[0] : Number.NaN);
    return Number.isNaN(at) || at < index;
  });
  return Object.assign(Object.fromEntries(kept), ...shifted, { [path]: String(Math.max(0, count - 1)) });
}

function moved(typed: Typed, path: string, from: number, to: number): Typed {
  const name = `${path}.${from}`;
  return Object.fromEntries(
    Object.entries(typed)
      .filter(([key]) => key === name || key.startsWith(`${name}.`))
      .map(([key, text]) => [`${path}.${to}${key.slice(name.length)}`, text]),
  );
}
