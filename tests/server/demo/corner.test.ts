import { describe, expect, it } from "vitest";
import { toeOnTray } from "#server/demo/heron/10-too-high.ts";
import { corner, rackOnTray, upright } from "#server/demo/heron/corner.ts";
import { toeAt } from "./corner-travel.ts";

describe("corner", () => {
  it("has its joints where the upright measured on the bench puts them", () => {
    const face = corner.wheelCentre[1] + upright.wheelOffset;
    for (const [joint, point] of [
      [upright.lower, corner.lowerJoint],
      [upright.upper, corner.upperJoint],
    ] as const) {
      expect(point).toEqual([joint.fore, face + joint.out, upright.loadedRadius + joint.up]);
    }
    expect(corner.wheelCentre[2]).toBe(upright.loadedRadius);
  });

  it("hardly steers itself with the rack as drawn: under 0.05° over 40 mm either way", () => {
    for (const travel of [-40, -20, 20, 40]) expect(Math.abs(toeAt(corner, travel))).toBeLessThan(0.05);
  });

  it("toes by what the entry says with the rack on the tray", () => {
    const built = { ...corner, rodInner: rackOnTray };
    expect(toeAt(built, 0)).toBeCloseTo(0, 6);
    expect(toeAt(built, 40).toFixed(2)).toBe(toeOnTray.bump40.toFixed(2));
    expect(toeAt(built, 20).toFixed(2)).toBe(toeOnTray.bump20.toFixed(2));
    expect(toeAt(built, -40).toFixed(2)).toBe(toeOnTray.rebound40.toFixed(2));
  });
});

describe("toeAt", () => {
  it("keeps the toe of equal parallel arms with a parallel rod (common practice)", () => {
    const parallel = {
      lowerFront: [100, 300, 150],
      lowerRear: [-100, 300, 150],
      lowerJoint: [0, 600, 150],
      upperFront: [100, 300, 350],
      upperRear: [-100, 300, 350],
      upperJoint: [0, 600, 350],
      rodInner: [90, 300, 200],
      rodOuter: [90, 600, 200],
      wheelCentre: [0, 650, 250],
    } as const;
    for (const travel of [-40, 15, 40]) expect(toeAt(parallel, travel)).toBeCloseTo(0, 6);
  });
});
