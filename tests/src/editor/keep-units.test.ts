import { describe, expect, it } from "vitest";
import { keepUnits } from "#src/editor/keep-units.ts";

const tied = (text: string) => keepUnits(text).replaceAll("\u00a0", "~");

describe("keepUnits", () => {
  it("ties a number to the unit after it", () => {
    expect(tied("a 25 mm tube, 1.5 mm below; 40 % of 12 kN.")).toBe(
      "a 25~mm tube, 1.5~mm below; 40~% of 12~kN.",
    );
  });

  it("leaves words that only begin like a unit", () => {
    expect(tied("4 men and 2 mmm, 3 gantries, 7 metres")).toBe("4 men and 2 mmm, 3 gantries, 7 metres");
  });
});
