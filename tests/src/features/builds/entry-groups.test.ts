import { describe, expect, it } from "vitest";
import type { StageView } from "#shared/contracts/builds.ts";
import type { EntryState, WorkshopEntry } from "#shared/contracts/entries.ts";
import { countStates, groupEntries } from "#src/features/builds/entry-groups.ts";

const stages: StageView[] = ["frame", "seat"].map((id) => ({
  id,
  title: id,
  state: "planned",
  entryCount: 0,
}));

function entry(id: string, state: EntryState, at: number, stageId = "frame"): WorkshopEntry {
  return {
    id,
    number: null,
    slug: id,
    title: id,
    state,
    stageId,
    updatedAt: at,
    scheduledAt: state === "scheduled" ? at : null,
    publishedAt: state === "public" ? at : null,
    hasUnpublishedChanges: false,
  };
}

const idsOf = (groups: ReturnType<typeof groupEntries>) =>
  groups.map(({ entries }) => entries.map(({ id }) => id));

describe("groupEntries", () => {
  it("puts drafts first, then scheduled, public and withdrawn", () => {
    const entries = [
      entry("gone", "withdrawn", 9),
      entry("read", "public", 8),
      entry("waiting", "scheduled", 7),
      entry("rough", "draft", 6),
    ];
    expect(idsOf(groupEntries(stages, entries, null))).toEqual([["rough", "waiting", "read", "gone"], []]);
  });

  it("lists the newest draft first but the next scheduled one first", () => {
    const entries = [
      entry("old", "draft", 1),
      entry("new", "draft", 2),
      entry("later", "scheduled", 20),
      entry("next", "scheduled", 10),
    ];
    expect(idsOf(groupEntries(stages, entries, null))[0]).toEqual(["new", "old", "next", "later"]);
  });

  it("keeps the order of the stages and shows one state alone when asked", () => {
    const entries = [
      entry("a", "public", 1, "seat"),
      entry("b", "draft", 2, "seat"),
      entry("c", "public", 3),
    ];
    expect(idsOf(groupEntries(stages, entries, "public"))).toEqual([["c"], ["a"]]);
  });
});

describe("countStates", () => {
  it("counts every state, those without an entry too", () => {
    const entries = [entry("a", "draft", 1), entry("b", "draft", 2), entry("c", "public", 3)];
    expect(countStates(entries)).toEqual({ draft: 2, scheduled: 0, public: 1, withdrawn: 0 });
  });
});
