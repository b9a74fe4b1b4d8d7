import { describe, expect, it } from "vitest";
import type { InputField } from "#shared/calculators/inputs.ts";
import { findCalculator } from "#shared/calculators/registry.ts";
import { typedFrom, workTyped } from "#src/features/workings/sum.ts";
import { templateAddresses } from "#src/features/workings/template-addresses.ts";
import { stepped } from "#src/features/workings/typed-number.ts";

const definition = findCalculator("saddle-cope");
if (!definition) throw new Error("there is no saddle-cope");
const kept = { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60 };

function work(changes: Record<string, string>, units: "mm" | "inch" = "mm") {
  if (!definition) throw new Error("there is no saddle-cope");
  const typed = { ...typedFrom(definition, kept, units), ...changes };
  return workTyped(definition, typed, units, kept);
}

function field(name: string) {
  const found = definition?.fields.find((each) => each.name === name);
  if (found?.kind !== "number") throw new Error(`no number ${name}`);
  return found as Extract<InputField, { kind: "number" }>;
}

describe("typedFrom", () => {
  it("writes the inputs in the person's unit, defaults filled in", () => {
    expect(definition && typedFrom(definition, kept, "mm")).toMatchObject({
      branchOd: "38.1",
      angle: "60",
      offset: "0",
    });
    expect(definition && typedFrom(definition, kept, "inch")).toMatchObject({ branchOd: "1.5", angle: "60" });
  });
});

describe("workTyped", () => {
  it("gives numbers that nobody touched as they were kept, in inches too", () => {
    const worked = work({ angle: "45" }, "inch");
    expect(worked).toMatchObject({ ok: true, value: { inputs: { ...kept, angle: 45 } } });
  });

  it("reads fractions of an inch", () => {
    expect(work({ branchOd: "1 1/4" }, "inch")).toMatchObject({
      ok: true,
      value: { inputs: { branchOd: 31.75 } },
    });
  });

  it("names the field and asks for a number when it is none", () => {
    expect(work({ angle: "steep" })).toEqual({
      ok: false,
      issue: { field: "angle", message: "Angle between the axes: type a number, such as 60 or 48/2." },
    });
  });

  it("names the limits in the person's own unit", () => {
    expect(work({ branchWall: "0" }, "inch")).toMatchObject({
      issue: { field: "branchWall", message: "Branch wall must be between 0.0079 in and 7.8740 in." },
    });
    expect(work({ angle: "95" })).toMatchObject({
      issue: { field: "angle", message: "Angle between the axes must be between 15° and 90°." },
    });
  });

  it("falls back on the default of an emptied optional input, and asks for a needed one", () => {
    expect(work({ offset: " " })).toMatchObject({ ok: true, value: { inputs: { offset: 0 } } });
    expect(work({ headerOd: "" })).toMatchObject({ ok: false, issue: { field: "headerOd" } });
  });
});

describe("stepped", () => {
  it("moves by the field's step in mm, a 64th in inches, and stops at the limits", () => {
    expect(stepped(field("branchOd"), "38.1", "mm", 1)).toBe("38.2");
    expect(stepped(field("branchOd"), "1 1/2", "inch", 1)).toBe("1.515625");
    expect(stepped(field("angle"), "90", "mm", 1)).toBe("90");
    expect(stepped(field("angle"), "steep", "mm", 1)).toBeUndefined();
  });
});

describe("templateAddresses", () => {
  it("carries the inputs that are on the screen", () => {
    const [a4, , svg] = templateAddresses("/api/workings/x", { angle: 45 });
    expect(a4?.href).toBe("/api/workings/x/template/pdf?paper=a4&angle=45");
    expect(svg?.href).toBe("/api/workings/x/template/svg?angle=45");
    expect(templateAddresses("/t", {})[3]?.href).toBe("/t/template/dxf");
  });
});
