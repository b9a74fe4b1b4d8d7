import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { overlap, type Paper, papers, tileSheet } from "#shared/templates/tiling.ts";

function tile(width: number, height: number, paper: Paper = "a4") {
  const tiling = tileSheet({ left: 0, top: 0, right: width, bottom: height }, paper);
  if (!tiling.ok) throw new Error(tiling.issue.message);
  return tiling.value;
}

describe("tileSheet", () => {
  it("puts a sheet that fits on one page, in the middle of it", () => {
    const { tiles, window, marks } = tile(120, 80);
    expect(tiles).toHaveLength(1);
    expect(tiles[0]?.x).toBeCloseTo(-(window.width - 120) / 2, 9);
    expect(marks).toEqual([]);
  });

  it("lays the page down when that saves pages", () => {
    expect(tile(260, 80).page).toEqual({ width: 297, height: 210 });
    expect(tile(120, 180).page).toEqual({ width: 210, height: 297 });
  });

  it("uses the sizes of ISO 216 A4 and Letter (8½ × 11 in)", () => {
    expect([papers.a4.width, papers.a4.height]).toEqual([210, 297]);
    expect([papers.letter.width, papers.letter.height]).toEqual([expect.closeTo(8.5 * 25.4, 9), 11 * 25.4]);
  });

  it("shows every place of the sheet, with each neighbour sharing the overlap", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 10, max: 900 }),
        fc.integer({ min: 10, max: 500 }),
        fc.constantFrom<Paper>("a4", "letter"),
        (width, height, paper) => {
          const { tiles, window } = tile(width, height, paper);
          const shows = (x: number, y: number) =>
            tiles.filter(
              (each) =>
                x >= each.x - 1e-9 &&
                x <= each.x + window.width + 1e-9 &&
                y >= each.y - 1e-9 &&
                y <= each.y + window.height + 1e-9,
            );
          for (const x of [0, width / 3, width / 2, width]) {
            for (const y of [0, height / 2, height]) expect(shows(x, y).length).toBeGreaterThan(0);
          }
          for (const each of tiles) {
            const next = tiles.find((other) => other.page === each.neighbours.right);
            if (next) expect(each.x + window.width - next.x).toBeCloseTo(overlap, 9);
            if (next) expect(next.neighbours.left).toBe(each.page);
          }
        },
      ),
    );
  });

  it("puts every alignment mark on the two pages of its seam", () => {
    const { tiles, window, marks } = tile(500, 300);
    expect(marks.length).toBeGreaterThan(4);
    for (const [x, y] of marks) {
      const pages = tiles.filter(
        (each) => x > each.x && x < each.x + window.width && y > each.y && y < each.y + window.height,
      );
      expect(pages.length).toBeGreaterThanOrEqual(2);
    }
  });

  it("says so when it would take more pages than anyone tapes together", () => {
    expect(tileSheet({ left: 0, top: 0, right: 6000, bottom: 4000 }, "a4")).toMatchObject({
      ok: false,
      issue: { message: expect.stringMatching(/would take \d+ pages of A4/) },
    });
  });
});
