import { describe, expect, it } from "vitest";
import { rowsOf } from "#src/features/reading/components/photo-blocks.tsx";

describe("rowsOf", () => {
  it.each([
    [2, [2]],
    [3, [3]],
    [4, [2, 2]],
    [5, [2, 3]],
    [6, [3, 3]],
  ])("lays %i photos out in rows of %j, in order", (count, lengths) => {
    const photos = Array.from({ length: count }, (_, index) => index);
    const rows = rowsOf(photos);
    expect(rows.map((row) => row.length)).toEqual(lengths);
    expect(rows.flat()).toEqual(photos);
  });
});
