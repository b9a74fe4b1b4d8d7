import { describe, expect, it } from "vitest";
import type { EntrySummary, StageView } from "#shared/contracts/builds.ts";
import { entriesByStage, firstOfStages } from "#src/features/builds/stage-entries.ts";

const stage = (id: string): StageView => ({ id, title: id, state: "done", entryCount: 0 });

const entry = (number: number, stageId: string, publishedAt = number): EntrySummary => ({
  id: `e${number}`,
  number,
  slug: `e${number}`,
  title: `Entry ${number}`,
  summary: "",
  stageId,
  publishedAt,
  photo: null,
  photoAlt: "",
});

describe("entriesByStage", () => {
  it("keeps the maker's order of stages, numbers within each, and stages that are still empty", () => {
    const stages = [stage("steering"), stage("frame"), stage("rear")];
    const groups = entriesByStage(stages, [entry(3, "frame"), entry(2, "steering"), entry(1, "frame")]);
    expect(groups.map((group) => [group.stage.id, group.entries.map((each) => each.number)])).toEqual([
      ["steering", [2]],
      ["frame", [1, 3]],
      ["rear", []],
    ]);
  });
});

describe("firstOfStages", () => {
  it("marks the earliest published entry of each stage", () => {
    const entries = [entry(1, "frame", 30), entry(2, "frame", 10), entry(3, "steering", 20)];
    expect(firstOfStages(entries)).toEqual(new Set(["e2", "e3"]));
  });
});
