import type { InputField } from "#shared/calculators/inputs.ts";

type SimpleField = Exclude<InputField, { kind: "point" | "group" | "list" }>;

/** One box of the form: where it stands and what it is called there. */
export interface Leaf {
  path: string;
  label: string;
  field: SimpleField;
}

/**
 * Every box that a form of these fields can have, those inside points, groups and lists too.
 *
 * @param places how many items of each list are counted; 0 describes an item once, without its place, and a point as a whole
 */
export function leavesOf(fields: readonly InputField[], places: number, within = "", owner = ""): Leaf[] {
  return fields.flatMap((field): Leaf[] => {
    const path = within + field.name;
    const label = owner
      ? `${owner}: ${field.label.charAt(0).toLowerCase()}${field.label.slice(1)}`
      : field.label;
    if (field.kind === "group") return leavesOf(field.fields, places, `${path}.`, field.label);
    if (field.kind === "point") {
      // Axes are called after their point already.
      const axes = leavesOf(field.axes, places, `${path}.`, owner);
      return places === 0 ? axes.slice(0, 1).map((axis) => ({ ...axis, label })) : axes;
    }
    if (field.kind !== "list") return [{ path, label, field }];
    if (places === 0) return leavesOf([{ ...field.item, name: "0" }], 0, `${path}.`);
    return Array.from({ length: places }, (_, place) =>
      leavesOf([{ ...field.item, name: String(place) }], places, `${path}.`).map((leaf) => ({
        ...leaf,
        label: `${leaf.label} (${place + 1})`,
      })),
    ).flat();
  });
}
