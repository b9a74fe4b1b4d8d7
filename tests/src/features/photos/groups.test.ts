import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { DocumentNode } from "#shared/document/types.ts";
import { groupsOf } from "#src/features/photos/use-photo-uploads.tsx";

const photos = (count: number): DocumentNode[] =>
  Array.from({ length: count }, (_, index) => ({ type: "photo", attrs: { photoId: String(index) } }));

describe("groupsOf", () => {
  it("leaves a single photo alone", () => {
    expect(groupsOf(photos(1))).toEqual(photos(1));
  });

  it("keeps every photo in its order, in groups of two to six", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 40 }), (count) => {
        const groups = groupsOf(photos(count));
        expect(groups.flatMap((group) => group.content ?? [])).toEqual(photos(count));
        for (const group of groups) {
          expect(group.content?.length).toBeGreaterThanOrEqual(2);
          expect(group.content?.length).toBeLessThanOrEqual(6);
        }
      }),
    );
  });
});
