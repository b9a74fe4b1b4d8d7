import { describe, expect, it } from "vitest";
import { z } from "zod";
import { choiceInput, countInput, describeInputs, numberInput } from "#shared/calculators/inputs.ts";
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
