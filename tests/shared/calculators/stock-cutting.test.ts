import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { StockCuttingResults } from "#shared/calculators/stock-cutting/formula.ts";
import { inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const piece = (length: number, count = 1, label = "P") => ({ label, length, count });
const plan = (inputs: object) =>
  resultsOf<StockCuttingResults>("stock-cutting", { stock: [{ length: 6000 }], kerf: 0, ...inputs });
const fault = (inputs: object) =>
  issueOf("stock-cutting", { stock: [{ length: 6000 }], pieces: [piece(1000, 4)], ...inputs });

describe("stock-cutting, limit cases", () => {
  it("cuts a bar into pieces that fill it exactly, kerfs between them only", () => {
    const { bars, utilisation, plans } = plan({ pieces: [piece(1998, 3)], kerf: 3 });
    expect([bars, plans[0]?.offcut]).toEqual([1, 0]);
    expect(utilisation).toBeCloseTo((100 * 5994) / 6000, 9);
  });

  it("needs a second bar when the kerfs no longer fit", () => {
    expect(plan({ pieces: [piece(1998.1, 3)], kerf: 3 }).bars).toBe(2);
  });

  it("takes a piece as long as the bar", () => {
    expect(plan({ pieces: [piece(6000, 2)], kerf: 3 })).toMatchObject({
      bars: 2,
      utilisation: 100,
      proven: true,
    });
  });

  it("takes a piece as long as a bar that is no whole tenth of a millimetre", () => {
    expect(plan({ pieces: [piece(2438.44)], stock: [{ length: 2438.44 }], kerf: 3.2 }).bars).toBe(1);
  });

  it("loses the trim from every bar", () => {
    expect(plan({ pieces: [piece(3000, 2)] }).bars).toBe(1);
    expect(plan({ pieces: [piece(3000, 2)], trim: 1 }).bars).toBe(2);
  });

  it("measures the offcut after the last cut", () => {
    const { plans } = plan({ pieces: [piece(1000, 2)], kerf: 3, trim: 10 });
    expect(plans).toEqual([
      { stock: 6000, cuts: [{ label: "P", length: 1000, count: 2 }], offcut: 3984, count: 1 },
    ]);
  });

  it("finds the two bars where longest first, each into the first bar with room, takes three", () => {
    const pieces = [piece(3600), piece(3000), piece(1800), piece(1200, 3)];
    expect(plan({ pieces })).toMatchObject({ bars: 2, utilisation: 100, proven: true });
  });

  it("keeps the marks of pieces of one length apart", () => {
    const { plans } = plan({ pieces: [piece(2000, 2, "A"), piece(2000, 1, "B")] });
    expect(plans).toEqual([
      {
        stock: 6000,
        cuts: [
          { label: "A", length: 2000, count: 2 },
          { label: "B", length: 2000, count: 1 },
        ],
        offcut: 0,
        count: 1,
      },
    ]);
  });
});

describe("stock-cutting, several lengths and prices", () => {
  it("takes the least length when bars have no price", () => {
    const results = plan({ pieces: [piece(2900, 3)], stock: [{ length: 6000 }, { length: 3000 }] });
    expect(results).toMatchObject({ measure: "length", stockLength: 9000, lowerBound: 9000, cost: null });
  });

  it("takes the least cost when all have one", () => {
    const stock = [
      { length: 6000, price: 30 },
      { length: 3000, price: 9.5 },
    ];
    expect(plan({ pieces: [piece(2900, 4)], stock })).toMatchObject({
      measure: "cost",
      bars: 4,
      cost: 38,
      proven: true,
    });
  });

  it("uses up free offcuts first, and no more than there are", () => {
    const stock = [
      { length: 6000, price: 30 },
      { length: 1500, price: 0, count: 2 },
    ];
    const { plans, cost } = plan({ pieces: [piece(1400, 6)], stock });
    expect(plans.find(({ stock: length }) => length === 1500)?.count).toBe(2);
    expect(cost).toBe(30);
  });
});

describe("stock-cutting, invariances", () => {
  const pieces = [piece(1840, 4, "A"), piece(745, 8, "B"), piece(1120, 6, "C"), piece(430, 10, "D")];

  it("does not mind the order or the splitting of the list", () => {
    const split = [piece(430, 4, "D"), ...pieces.slice(0, 3).toReversed(), piece(430, 6, "E")];
    expect(plan({ pieces: split, kerf: 2 }).bars).toBe(plan({ pieces, kerf: 2 }).bars);
  });

  it("needs as many bars when everything is halved", () => {
    const halved = pieces.map((each) => ({ ...each, length: each.length / 2 }));
    const half = plan({ pieces: halved, stock: [{ length: 3000 }], kerf: 1 });
    expect(half.bars).toBe(plan({ pieces, kerf: 2 }).bars);
  });

  it("never needs fewer bars with a wider kerf or one piece more", () => {
    const { bars } = plan({ pieces, kerf: 2 });
    expect(plan({ pieces, kerf: 12 }).bars).toBeGreaterThanOrEqual(bars);
    expect(plan({ pieces: [...pieces, piece(5000)], kerf: 2 }).bars).toBeGreaterThanOrEqual(bars);
  });

  it("answers the same each time", () => {
    const mixed = { pieces, stock: [{ length: 6000 }, { length: 4500 }, { length: 3700 }], kerf: 2 };
    expect(plan(mixed)).toEqual(plan(mixed));
  });
});

describe("stock-cutting, failures", () => {
  it("names the piece that is longer than the longest bar leaves", () => {
    expect(fault({ pieces: [piece(1000), piece(5995)], trim: 10 })).toEqual({
      field: "pieces.1.length",
      message:
        "This piece is longer than the longest bar, which leaves 5990 mm after trimming. Shorten it, join it of two, or add a longer bar.",
    });
  });

  it.each([
    ["no pieces", { pieces: [] }, "pieces", /at least 1 piece/],
    ["part of a piece", { pieces: [piece(1000, 1.5)] }, "pieces.0.count", /whole number/],
    ["a piece that is none", { pieces: ["rail"] }, "pieces.0", /label, length in mm and count/],
    [
      "more pieces than a plan takes",
      { pieces: [piece(10, 1000), piece(11, 1000), piece(12, 1)] },
      "pieces",
      /2001 pieces.*at most 2000/,
    ],
    ["too few bars", { stock: [{ length: 2500, count: 1 }] }, "stock", /does not hold all the pieces/],
    [
      "too few bars, though long enough together",
      { stock: [{ length: 1900, count: 3 }], pieces: [piece(1000, 4)] },
      "stock",
      /does not hold/,
    ],
    ["no bars at all", { stock: [{ length: 6000, count: 0 }] }, "stock", /There are no bars/],
    [
      "a price for some",
      { stock: [{ length: 6000, price: 3 }, { length: 3000 }] },
      "stock.1.price",
      /for every bar length, or for none/,
    ],
    ["a trim that takes the bar", { stock: [{ length: 100 }], trim: 100 }, "trim", /below 100 mm/],
    ["a negative kerf", { kerf: -1 }, "kerf", /between 0 and 20 mm/],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(fault(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });
});

describe("stock-cutting, any input the schema lets through", () => {
  const pieces = fc.array(
    fc.record({
      label: fc.string({ maxLength: 5 }),
      length: inRange(40, 6500),
      count: fc.integer({ min: 1, max: 6 }),
    }),
    { minLength: 1, maxLength: 4 },
  );
  const stock = fc.array(
    fc.record(
      { length: inRange(300, 7000), count: fc.integer({ min: 0, max: 20 }), price: inRange(0, 90) },
      { requiredKeys: ["length"] },
    ),
    { minLength: 1, maxLength: 2 },
  );
  const inputs = fc.record({ pieces, stock, kerf: inRange(0, 20), trim: inRange(0, 60) });

  it("has every listed result as a number", () => {
    expect(missingResultFields("stock-cutting")).toEqual([]);
  });

  it("gives finite numbers or one named fault, never NaN", () => {
    const { worked, faults } = runMany("stock-cutting", inputs, 600);
    expect(worked).toBeGreaterThan(80);
    expect(faults.size).toBeGreaterThan(0);
  });
});
