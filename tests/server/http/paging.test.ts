import fc from "fast-check";
import { v7 as uuid } from "uuid";
import { describe, expect, it } from "vitest";
import { onePage, pageSize, readCursor, writeCursor } from "#server/http/paging.ts";
import { cursor } from "#shared/contracts/common.ts";

describe("readCursor", () => {
  it("reads back any position that was written", () => {
    fc.assert(
      fc.property(fc.nat({ max: 8.64e15 }), fc.uuid(), (at, id) => {
        const written = writeCursor({ at, id });
        expect(cursor.safeParse(written).success).toBe(true);
        expect(readCursor(written)).toEqual({ at, id });
      }),
    );
  });

  it("refuses anything else as the caller's mistake", () => {
    for (const wrong of ["", "x", "!!", Buffer.from("1.2").toString("base64url")]) {
      expect(() => readCursor(wrong)).toThrow(expect.objectContaining({ code: "invalid_input" }));
    }
    expect(readCursor(undefined)).toBeNull();
  });
});

describe("onePage", () => {
  const rows = (count: number) => Array.from({ length: count }, (_, at) => ({ at, id: uuid() }));

  it("has a next page only when a row stands beyond this one", () => {
    expect(onePage(rows(pageSize), (row) => row).next).toBeNull();
    const { page, next } = onePage(rows(pageSize + 1), (row) => row);
    expect(page).toHaveLength(pageSize);
    expect(next && readCursor(next)).toEqual(page.at(-1));
  });
});
