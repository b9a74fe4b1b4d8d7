import { describe, expect, it } from "vitest";
import { z } from "zod";
import {
  choiceInput,
  countInput,
  describeInputs,
  numberInput,
  pointInput,
  textInput,
} from "#shared/calculators/inputs.ts";
import { calculators } from "#shared/calculators/registry.ts";

const wall = numberInput({
  label: "Wall",
  unit: "mm",
  help: "Of the tube.",
  min: 1,
  max: 9,
  step: 0.1,
  decimals: 1,
});

describe("describeInputs", () => {
  it("describes a number with its limits and its default from the schema alone", () => {
    expect(describeInputs(z.object({ wall: wall.default(2) }))).toEqual([
      expect.objectContaining({
        name: "wall",
        kind: "number",
        label: "Wall",
        unit: "mm",
        min: 1,
        max: 9,
        default: 2,
        optional: true,
      }),
    ]);
  });

  it("describes choices, switches, groups and lists", () => {
    const kind = choiceInput({
      label: "End",
      help: "",
      choices: [
        { value: "saddle", label: "Saddle" },
        { value: "square", label: "Square" },
      ],
    });
    const fields = describeInputs(
      z.object({
        kind,
        turned: z.boolean().meta({ label: "Turned over", help: "" }).default(false),
        spring: z.object({ wall }).meta({ label: "Spring", help: "" }).optional(),
        walls: z.array(wall).meta({ label: "Walls", help: "" }),
      }),
    );
    expect(fields.map((field) => [field.name, field.kind, field.label, field.optional])).toEqual([
      ["kind", "choice", "End", false],
      ["turned", "switch", "Turned over", true],
      ["spring", "group", "Spring", true],
      ["walls", "list", "Walls", false],
    ]);
    expect(fields[2]).toMatchObject({ fields: [{ name: "wall", kind: "number" }] });
    expect(fields[3]).toMatchObject({ item: { kind: "number", max: 9 } });
  });

  it("describes a point by its axes, words by their length, and one-or-a-list as the list", () => {
    const joint = pointInput({
      label: "Joint",
      help: "",
      axes: ["fore", "out", "up"],
      min: -9,
      max: 9,
      step: 1,
    });
    const fields = describeInputs(
      z.object({
        joint,
        mark: textInput({ label: "Mark", help: "", maxLength: 3 }),
        radius: z.union([wall, z.array(wall)]).meta({ label: "Radius", help: "" }),
      }),
    );
    expect(fields).toMatchObject([
      {
        name: "joint",
        kind: "point",
        axes: [{ label: "Joint, fore", unit: "mm" }, {}, { label: "Joint, up" }],
      },
      { name: "mark", kind: "text", maxLength: 3 },
      { name: "radius", kind: "list", label: "Radius", item: { kind: "number", max: 9 } },
    ]);
    expect(joint.safeParse([1, 2]).error?.issues[0]?.message).toBe(
      "Give joint as three numbers in mm: fore, out, up.",
    );
    expect(joint.safeParse([1, 2, 10]).error?.issues[0]?.message).toBe(
      "Joint, up must be between -9 and 9 mm.",
    );
  });

  it("refuses a field without words", () => {
    expect(() => describeInputs(z.object({ bare: z.number() }))).toThrow(/bare has no description/);
  });
});

describe("countInput", () => {
  it("says that a part will not do", () => {
    const bends = countInput({ label: "Bends", unit: "", help: "", min: 1, max: 9, step: 1 });
    expect(bends.safeParse(1.5).error?.issues[0]?.message).toBe("Bends must be a whole number.");
    expect(bends.safeParse(10).error?.issues[0]?.message).toBe("Bends must be between 1 and 9.");
  });
});

describe("calculators", () => {
  it.each(calculators.map((each) => [each.id, each] as const))(
    "%s works its own example",
    (_, calculator) => {
      const inputs = calculator.inputs.parse(calculator.example);
      const computed = calculator.compute(inputs);
      expect(computed.ok).toBe(true);
      if (!computed.ok) return;
      for (const { name } of calculator.resultFields) {
        const value = name
          .split(".")
          .reduce<unknown>((at, key) => (at as Record<string, unknown>)[key], computed.value);
        expect(value, name).toEqual(expect.any(Number));
      }
    },
  );

  it.each(calculators.map((each) => [each.id, each] as const))(
    "%s carries cautions, a method and sources",
    (_, calculator) => {
      expect(calculator.cautions.length).toBeGreaterThan(0);
      expect(calculator.method.formula.length).toBeGreaterThan(0);
      expect(calculator.method.sources.length).toBeGreaterThan(0);
    },
  );
});
