import { describe, expect, it } from "vitest";
import { countWords, emptyDocument, photosIn, plainText, workingsIn } from "#shared/document/read.ts";
import { validateDocument } from "#shared/document/validate.ts";

const first = "0193a5b0-0000-7000-8000-000000000001";
const second = "0193a5b0-0000-7000-8000-000000000002";
const third = "0193a5b0-0000-7000-8000-000000000003";
const words = (text: string) => ({ type: "paragraph", content: [{ type: "text", text }] });
const photo = (photoId: string, alt: string | null, caption = "") => ({
  type: "photo",
  attrs: { photoId, alt, caption },
});

const document = {
  type: "doc" as const,
  content: [
    words("The short arm was coped at the wrong clock."),
    {
      type: "bulletList",
      content: [
        {
          type: "listItem",
          content: [
            {
              type: "paragraph",
              content: [
                { type: "text", text: "Saw" },
                { type: "hardBreak" },
                { type: "text", text: "42.4 × 2.6" },
              ],
            },
            photo(first, null),
          ],
        },
      ],
    },
    { type: "photoGroup", content: [photo(second, "", "Both ends"), photo(first, "The gap at the heel")] },
    {
      type: "working",
      attrs: { workingId: third, calculator: "saddle-cope", title: "Lower arm", inputs: { angle: 70 } },
    },
  ],
};

describe("plainText", () => {
  it("gives a line for each block, captions and titles of workings included", () => {
    expect(plainText(document)).toBe(
      "The short arm was coped at the wrong clock.\nSaw 42.4 × 2.6\nBoth ends\nLower arm",
    );
  });
});

describe("countWords", () => {
  it("counts numbers as words and signs alone as none", () => {
    expect(countWords(document)).toBe(9 + 3 + 2 + 2);
  });

  it("counts nothing in an empty document", () => {
    expect(countWords(emptyDocument)).toBe(0);
  });
});

describe("photosIn", () => {
  it("lists photos in reading order and keeps 'not said' apart from 'decorative'", () => {
    expect(photosIn(document).map(({ photoId, alt }) => [photoId, alt])).toEqual([
      [first, null],
      [second, ""],
      [first, "The gap at the heel"],
    ]);
  });
});

describe("workingsIn", () => {
  it("gives each working with its numbers", () => {
    expect(workingsIn(document)).toEqual([
      { workingId: third, calculator: "saddle-cope", title: "Lower arm", inputs: { angle: 70 } },
    ]);
  });
});

describe("emptyDocument", () => {
  it("passes the check of every saved document", () => {
    expect(validateDocument(emptyDocument)).toEqual({ ok: true, value: emptyDocument });
  });
});
