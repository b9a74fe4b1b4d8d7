import { describe, expect, it } from "vitest";
import { type PhotoView, photoLimits } from "#shared/contracts/photos.ts";
import { UploadQueue } from "#src/features/photos/upload-queue.ts";
import { ApiError } from "#src/lib/api.ts";

const photo = (id: string) => ({ id }) as PhotoView;
const file = (name: string, size = 10) => {
  const made = new File(["x"], name, { type: "image/jpeg" });
  Object.defineProperty(made, "size", { value: size });
  return made;
};

function setUp() {
  const sent: {
    name: string;
    progress: (share: number) => void;
    signal: AbortSignal;
    finish: (photo: PhotoView) => void;
    fail: (error: Error) => void;
  }[] = [];
  const done: string[] = [];
  let ids = 0;
  const queue = new UploadQueue({
    send: ({ name }, progress, signal) =>
      new Promise((finish, fail) => {
        sent.push({ name, progress, signal, finish, fail });
        signal.addEventListener("abort", () => fail(signal.reason as Error));
      }),
    newId: () => `u${++ids}`,
    onDone: (upload, { id }) => done.push(`${upload.place}:${id}`),
  });
  const states = () => queue.uploads().map(({ name, state }) => `${name} ${state.kind}`);
  const request = (index: number) => {
    const found = sent[index];
    if (!found) throw new Error(`Nothing was sent as number ${index}`);
    return found;
  };
  return { queue, sent, done, states, request };
}

const settle = () => new Promise((resolve) => setTimeout(resolve));

describe("UploadQueue", () => {
  it("sends two at once and the next when one is done", async () => {
    const { queue, sent, done, states, request } = setUp();
    queue.add([file("a"), file("b"), file("c")], "here");
    expect(states()).toEqual(["a sending", "b sending", "c waiting"]);
    request(0).finish(photo("p1"));
    await settle();
    expect(sent.map(({ name }) => name)).toEqual(["a", "b", "c"]);
    expect(states()).toEqual(["b sending", "c sending"]);
    expect(done).toEqual(["here:p1"]);
  });

  it("tells how far each has come", () => {
    const { queue, request } = setUp();
    queue.add([file("a")], "here");
    request(0).progress(0.4);
    expect(queue.uploads()[0]?.state).toEqual({ kind: "sending", share: 0.4 });
  });

  it("keeps a failed photo with the server's words and sends it again when asked", async () => {
    const { queue, done, request } = setUp();
    queue.add([file("a")], "here");
    request(0).fail(new ApiError(0, "offline", "The connection broke off."));
    await settle();
    expect(queue.uploads()[0]?.state).toEqual({
      kind: "failed",
      message: "The connection broke off.",
      canRetry: true,
    });
    queue.retry("u1");
    request(1).finish(photo("p1"));
    await settle();
    expect(done).toEqual(["here:p1"]);
    expect(queue.uploads()).toEqual([]);
  });

  it("offers no second try for what the server will refuse again", async () => {
    const { queue, request } = setUp();
    queue.add([file("a")], "here");
    request(0).fail(
      new ApiError(415, "unsupported_media", "Refused.", { photo: "This file is not a photo." }),
    );
    await settle();
    expect(queue.uploads()[0]?.state).toEqual({
      kind: "failed",
      message: "This file is not a photo.",
      canRetry: false,
    });
  });

  it("refuses a file over the limit without sending it, and says its size and the limit", () => {
    const { queue, sent } = setUp();
    queue.add([file("a", photoLimits.bytes + 1024 * 1024)], "here");
    expect(sent).toEqual([]);
    expect(queue.uploads()[0]?.state).toMatchObject({ kind: "failed", canRetry: false });
    expect(queue.uploads()[0]?.state).toMatchObject({ message: expect.stringMatching(/26\.0 MB.*25 MB/) });
  });

  it("cancel stops the request, forgets the photo and lets the next one go", async () => {
    const { queue, sent, done, request } = setUp();
    queue.add([file("a"), file("b"), file("c")], "here");
    queue.cancel("u1");
    await settle();
    expect(request(0).signal.aborted).toBe(true);
    expect(sent.map(({ name }) => name)).toEqual(["a", "b", "c"]);
    expect(queue.uploads().map(({ id }) => id)).toEqual(["u2", "u3"]);
    expect(done).toEqual([]);
  });
});
