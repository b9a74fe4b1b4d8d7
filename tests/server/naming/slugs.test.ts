import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { freeSlug, slugFromTitle } from "#server/naming/slugs.ts";
import { slug } from "#shared/contracts/common.ts";

describe("slugFromTitle", () => {
  it.each([
    ["Setting out the frame", "setting-out-the-frame"],
    ["Rack 22 mm too high!", "rack-22-mm-too-high"],
    ["Öl & Späne", "oel-and-spaene"],
    ["TIGWelding", "tigwelding"],
    ["🔥🔥", "untitled"],
    ["", "untitled"],
  ])("makes %j into %s", (title, expected) => {
    expect(slugFromTitle(title, "untitled")).toBe(expected);
  });

  it("cuts a long title at a word", () => {
    const made = slugFromTitle(
      "the short arm was coped at the wrong clock and had to be scrapped again",
      "x",
    );
    expect(made).toBe("the-short-arm-was-coped-at-the-wrong-clock-and-had-to-be");
  });

  it("always makes an address that the contract takes, with room for a number", () => {
    fc.assert(
      fc.property(fc.string({ unit: "grapheme", maxLength: 140 }), (title) => {
        const made = slugFromTitle(title, "untitled");
        expect(slug.safeParse(made).success).toBe(true);
        expect(slug.safeParse(`${made}-12345`).success).toBe(true);
      }),
    );
  });
});

describe("freeSlug", () => {
  it("takes the first number that is free", () => {
    const taken = new Set(["frame", "frame-2", "frame-4"]);
    expect(freeSlug("frame", (each) => taken.has(each))).toBe("frame-3");
    expect(freeSlug("steering", (each) => taken.has(each))).toBe("steering");
  });
});
