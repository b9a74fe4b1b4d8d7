import { describe, expect, it } from "vitest";
import type { BuildPage, StageView } from "#shared/contracts/builds.ts";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import {
  withAnswer,
  withoutStage,
  withStageAdded,
  withStageChanged,
  withStagesOrdered,
} from "#src/features/builds/own-build-changes.ts";

const stage = (id: string): StageView => ({ id, title: id, state: "planned", entryCount: 0 });

function buildWith(...stages: string[]): WorkshopBuild {
  return {
    id: "b",
    slug: "log-stand",
    title: "Log stand",
    purpose: "Holds logs.",
    status: "planning",
    cover: null,
    coverAlt: "",
    owner: { handle: "tam", name: "Tam", avatar: null },
    entryCount: 0,
    lastEntryAt: null,
    createdAt: 0,
    stages: stages.map(stage),
    entries: [],
  };
}

const ids = (build: WorkshopBuild) => build.stages.map(({ id }) => id);

describe("withStageChanged", () => {
  it("changes the one stage and leaves the build it was given", () => {
    const before = buildWith("frame", "seat");
    const after = withStageChanged(before, "seat", { state: "done" });
    expect(after.stages.map(({ state }) => state)).toEqual(["planned", "done"]);
    expect(before.stages.map(({ state }) => state)).toEqual(["planned", "planned"]);
  });
});

describe("withStageAdded", () => {
  it("puts the stage at the end", () => {
    expect(ids(withStageAdded(buildWith("frame"), stage("seat")))).toEqual(["frame", "seat"]);
  });

  it("does not show a stage twice that a reading of the page has brought already", () => {
    expect(ids(withStageAdded(buildWith("frame", "seat"), stage("seat")))).toEqual(["frame", "seat"]);
  });
});

describe("withoutStage", () => {
  it("leaves the others in their order", () => {
    expect(ids(withoutStage(buildWith("frame", "seat", "rear"), "seat"))).toEqual(["frame", "rear"]);
  });
});

describe("withStagesOrdered", () => {
  it("follows the order given", () => {
    expect(ids(withStagesOrdered(buildWith("a", "b", "c"), ["c", "a", "b"]))).toEqual(["c", "a", "b"]);
  });

  it("keeps stages the order does not name at the end", () => {
    expect(ids(withStagesOrdered(buildWith("a", "new", "b"), ["b", "a"]))).toEqual(["b", "a", "new"]);
  });
});

describe("withAnswer", () => {
  it("takes the new words and keeps the stages and entries of the workshop", () => {
    const before = buildWith("frame");
    const answer: BuildPage = {
      ...before,
      title: "Log rack",
      slug: "log-rack",
      stages: [],
      entries: [],
      mine: true,
    };
    const after = withAnswer(before, answer);
    expect(after).toEqual({ ...before, title: "Log rack", slug: "log-rack" });
  });
});
