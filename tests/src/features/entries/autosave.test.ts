import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { emptyDocument } from "#shared/document/read.ts";
import { Autosave } from "#src/features/entries/autosave.ts";
import type { DraftContent } from "#src/features/entries/draft-content.ts";
import { ApiError } from "#src/lib/api.ts";

const start: DraftContent = { title: "", summary: "", stageId: "s1", document: emptyDocument };
const titled = (title: string): DraftContent => ({ ...start, title });
const offline = () => new ApiError(0, "offline", "The server cannot be reached.");

/** A server that the test answers by hand, and what the browser keeps. */
function setUp() {
  const requests: {
    content: DraftContent;
    baseVersion: number;
    answer: (version: number) => void;
    refuse: (error: Error) => void;
  }[] = [];
  const kept: { content: DraftContent | null } = { content: null };
  const autosave = new Autosave(
    {
      send: (content, baseVersion) =>
        new Promise((resolve, reject) => {
          requests.push({
            content,
            baseVersion,
            answer: (version) => resolve({ version, updatedAt: 500 }),
            refuse: reject,
          });
        }),
      keep: (unsaved) => {
        kept.content = unsaved?.content ?? null;
      },
      now: () => Date.now(),
    },
    { version: 1, content: start },
    100,
  );
  const request = (index: number) => {
    const found = requests[index];
    if (!found) throw new Error(`There was no request ${index}`);
    return found;
  };
  return { autosave, requests, request, kept };
}

const settle = () => vi.advanceTimersByTimeAsync(0);

describe("Autosave", () => {
  beforeEach(() => {
    vi.useFakeTimers();
  });
  afterEach(() => {
    vi.useRealTimers();
  });

  it("sends nothing while nothing changed", async () => {
    const { autosave, requests } = setUp();
    autosave.change({ ...start });
    await vi.advanceTimersByTimeAsync(20_000);
    expect(requests).toHaveLength(0);
    expect(autosave.state()).toEqual({ kind: "saved", at: 100 });
  });

  it("keeps each change in the browser at once and sends it a second after the last", async () => {
    const { autosave, requests, request, kept } = setUp();
    autosave.change(titled("W"));
    expect(kept.content?.title).toBe("W");
    expect(autosave.state().kind).toBe("waiting");
    await vi.advanceTimersByTimeAsync(900);
    autosave.change(titled("Wi"));
    await vi.advanceTimersByTimeAsync(999);
    expect(requests).toHaveLength(0);
    await vi.advanceTimersByTimeAsync(1);
    expect(request(0)).toMatchObject({ content: { title: "Wi" }, baseVersion: 1 });
    expect(autosave.state().kind).toBe("saving");
    request(0).answer(2);
    await settle();
    expect(autosave.state()).toEqual({ kind: "saved", at: 500 });
    expect(kept.content).toBeNull();
  });

  it("saves within eight seconds even while typing goes on", async () => {
    const { autosave, requests } = setUp();
    for (let half = 0; half < 20; half += 1) {
      autosave.change(titled("x".repeat(half + 1)));
      await vi.advanceTimersByTimeAsync(500);
    }
    expect(requests).toHaveLength(1);
  });

  it("sends what was typed meanwhile after the answer, on the new version, never two at once", async () => {
    const { autosave, requests, request, kept } = setUp();
    autosave.change(titled("one"));
    await vi.advanceTimersByTimeAsync(1000);
    autosave.change(titled("two"));
    await vi.advanceTimersByTimeAsync(30_000);
    expect(requests).toHaveLength(1);
    request(0).answer(2);
    await settle();
    expect(kept.content?.title).toBe("two");
    await vi.advanceTimersByTimeAsync(1000);
    expect(request(1)).toMatchObject({ content: { title: "two" }, baseVersion: 2 });
  });

  it("keeps the words on the device and tries again ever more slowly while the server cannot be reached", async () => {
    const { autosave, requests, request, kept } = setUp();
    autosave.change(titled("one"));
    await vi.advanceTimersByTimeAsync(1000);
    const waits = [2000, 4000, 8000, 16_000, 32_000, 60_000, 60_000];
    for (const [index, wait] of waits.entries()) {
      request(index).refuse(offline());
      await settle();
      expect(autosave.state()).toMatchObject({ kind: "kept", retryAt: Date.now() + wait });
      expect(kept.content?.title).toBe("one");
      await vi.advanceTimersByTimeAsync(wait);
    }
    request(waits.length).answer(2);
    await settle();
    expect(autosave.state().kind).toBe("saved");
    expect(requests).toHaveLength(waits.length + 1);
  });

  it("shows a refusal with its fields and waits for a change instead of repeating it", async () => {
    const { autosave, requests, request } = setUp();
    autosave.change(titled("far too long"));
    await vi.advanceTimersByTimeAsync(1000);
    request(0).refuse(new ApiError(422, "invalid_input", "Look again.", { title: "The title is too long." }));
    await vi.advanceTimersByTimeAsync(120_000);
    expect(requests).toHaveLength(1);
    expect(autosave.state()).toMatchObject({ kind: "refused", fields: { title: "The title is too long." } });
    autosave.change(titled("short"));
    await vi.advanceTimersByTimeAsync(1000);
    expect(request(1).content.title).toBe("short");
  });

  it("stops at a conflict but goes on keeping what is typed", async () => {
    const { autosave, requests, request, kept } = setUp();
    autosave.change(titled("mine"));
    await vi.advanceTimersByTimeAsync(1000);
    request(0).refuse(new ApiError(409, "draft_conflict", "The draft was saved elsewhere."));
    await settle();
    autosave.change(titled("mine, more"));
    await vi.advanceTimersByTimeAsync(60_000);
    await autosave.flush();
    expect(requests).toHaveLength(1);
    expect(autosave.state().kind).toBe("conflict");
    expect(kept.content?.title).toBe("mine, more");
  });

  it("saves the merged words on the other side's version after a conflict", async () => {
    const { autosave, request } = setUp();
    autosave.change(titled("mine"));
    await vi.advanceTimersByTimeAsync(1000);
    request(0).refuse(new ApiError(409, "draft_conflict", "The draft was saved elsewhere."));
    await settle();
    autosave.rebase({ version: 7, content: titled("theirs") }, titled("both"), 900);
    await vi.advanceTimersByTimeAsync(1000);
    expect(request(1)).toMatchObject({ content: { title: "both" }, baseVersion: 7 });
  });

  it("flush sends at once and waits for the answer", async () => {
    const { autosave, requests, request } = setUp();
    autosave.change(titled("one"));
    let flushed = false;
    const flush = autosave.flush().then(() => {
      flushed = true;
    });
    await settle();
    expect(requests).toHaveLength(1);
    expect(flushed).toBe(false);
    request(0).answer(2);
    await flush;
    expect(autosave.dirty).toBe(false);
  });

  it("sends nothing more once stopped, but what it kept stays", async () => {
    const { autosave, requests, kept } = setUp();
    autosave.change(titled("one"));
    autosave.stop();
    await vi.advanceTimersByTimeAsync(10_000);
    expect(requests).toHaveLength(0);
    expect(kept.content?.title).toBe("one");
  });
});
