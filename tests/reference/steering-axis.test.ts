import { describe, expect, it } from "vitest";
import type { SteeringAxisResults } from "#shared/calculators/steering-axis/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

/**
 * Signs by ISO 8855:2011 (left wheel: x forward, y left, z up; definitions from memory): each case is built so that
 * the sign can be told by eye, and the sizes come from right triangles.
 */
const upright = (inputs: object) =>
  resultsOf<SteeringAxisResults>("steering-axis", {
    lower: { out: 0, up: -100, fore: 0 },
    upper: { out: 0, up: 100, fore: 0 },
    wheelOffset: 0,
    loadedRadius: 300,
    ...inputs,
  });

describe("steering-axis signs, ISO 8855:2011", () => {
  it("counts inclination positive when the axis leans inboard at the top", () => {
    const { kpi, caster } = upright({ upper: { out: -200, up: 100, fore: 0 } });
    expect(kpi).toBeCloseTo(45, 12);
    expect(caster).toBeCloseTo(0, 12);
  });

  it("counts caster positive when the axis leans rearward at the top", () => {
    const { caster, kpi } = upright({ upper: { out: 0, up: 100, fore: -200 } });
    expect(caster).toBeCloseTo(45, 12);
    expect(kpi).toBeCloseTo(0, 12);
  });

  it("counts the steering-axis offset at the ground positive when the contact point is outboard of the axis", () => {
    const axisInboard = { lower: { out: -80, up: -100, fore: 0 }, upper: { out: -80, up: 100, fore: 0 } };
    expect(upright(axisInboard).scrubRadius).toBeCloseTo(80, 12);
    expect(upright({ ...axisInboard, wheelOffset: 100 }).scrubRadius).toBeCloseTo(-20, 12);
  });

  it("counts trail positive when the contact point is behind the axis: R·tan(caster) with the axis through the hub", () => {
    const { trail } = upright({
      lower: { out: 0, up: -100, fore: 10 },
      upper: { out: 0, up: 100, fore: -10 },
    });
    expect(trail).toBeCloseTo(300 * 0.1, 12);
  });

  it("moves the contact point inboard with positive camber, its top out", () => {
    const { scrubRadius, includedAngle } = upright({ camber: 10 });
    expect(scrubRadius).toBeCloseTo(-300 * Math.sin((10 * Math.PI) / 180), 12);
    expect(includedAngle).toBeCloseTo(10, 12);
  });

  it("leans the inner wheel out and the outer in when positive caster is steered (common practice)", () => {
    const { camberAtSteer } = upright({ upper: { out: 0, up: 100, fore: -20 } });
    expect(camberAtSteer["20"]).toBeGreaterThan(1);
    expect(camberAtSteer["-20"]).toBeCloseTo(-(camberAtSteer["20"] ?? 0), 12);
  });

  it("leans both wheels out when inclination is steered (common practice)", () => {
    const { camberAtSteer } = upright({ upper: { out: -40, up: 100, fore: 0 } });
    expect(camberAtSteer["20"]).toBeGreaterThan(0.5);
    expect(camberAtSteer["-20"]).toBeCloseTo(camberAtSteer["20"] ?? 0, 12);
  });
});

describe("steering-axis against the steered-camber formula of textbooks, from memory", () => {
  /** Camber gained by steer δ: asin(sin τ·sin δ) with caster τ alone; asin(sin σ cos σ (1 − cos δ)) with inclination σ. */
  const at = (angle: number) => (angle * Math.PI) / 180;

  it.each([5, 15, 30])("gives sin(camber) = sin(caster)·sin(%d°)", (steer) => {
    const { camberAtSteer, caster } = upright({ upper: { out: 0, up: 100, fore: -30 } });
    expect(Math.sin(at(camberAtSteer[String(steer)] ?? 0))).toBeCloseTo(
      Math.sin(at(caster)) * Math.sin(at(steer)),
      12,
    );
  });

  it.each([5, 15, 30])("gives sin(camber) = sin(kpi)·cos(kpi)·(1 − cos %d°)", (steer) => {
    const { camberAtSteer, kpi } = upright({ upper: { out: -30, up: 100, fore: 0 } });
    const expected = Math.sin(at(kpi)) * Math.cos(at(kpi)) * (1 - Math.cos(at(steer)));
    expect(Math.sin(at(camberAtSteer[String(steer)] ?? 0))).toBeCloseTo(expected, 12);
  });
});
