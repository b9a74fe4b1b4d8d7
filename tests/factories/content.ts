import type { Person } from "#server/http/viewer.ts";
import type { BuildPage, StageView } from "#shared/contracts/builds.ts";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import type { ContentBench } from "#tests/setup/content-bench.ts";

export function words(...lines: string[]) {
  return {
    type: "doc",
    content: lines.map((text) => ({ type: "paragraph", content: [{ type: "text", text }] })),
  };
}

export function photoBlock(photoId: string, alt: string | null, caption = "") {
  return { type: "photo", attrs: { photoId, alt, caption } };
}

export function workingBlock(workingId: string, inputs: Record<string, unknown>, title = "Lower front cope") {
  return { type: "working", attrs: { workingId, calculator: "saddle-cope", title, inputs } };
}

/** A build with one stage, which nobody but its builder sees yet. */
export async function startBuild(
  bench: ContentBench,
  builder: Person,
  title = "Heron",
): Promise<{ build: BuildPage; stage: StageView }> {
  const made = await bench.send(builder, "POST", "/api/builds", {
    title,
    purpose: "A single-seat hillclimb car",
    status: "under_way",
  });
  const stage = await bench.send(builder, "POST", `/api/builds/${made.body.slug}/stages`, { title: "Frame" });
  return { build: made.body, stage: stage.body };
}

export async function startEntry(
  bench: ContentBench,
  builder: Person,
  { build, stage }: { build: BuildPage; stage: StageView },
  title = "Setting out the frame",
): Promise<EntryDraft> {
  const made = await bench.send(builder, "POST", `/api/builds/${build.slug}/entries`, {
    stageId: stage.id,
    title,
  });
  return made.body;
}

/** Saves a draft over its present version; `change` is what differs. */
export async function saveOver(
  bench: ContentBench,
  builder: Person,
  draft: EntryDraft,
  change: Record<string, unknown>,
) {
  const { title, summary, stageId, document, version } = draft;
  return bench.send(builder, "PUT", `/api/entries/${draft.id}/draft`, {
    baseVersion: version,
    title,
    summary,
    stageId,
    document,
    ...change,
  });
}

export async function publish(bench: ContentBench, builder: Person, draft: EntryDraft) {
  return bench.send(builder, "POST", `/api/entries/${draft.id}/publish`, { baseVersion: draft.version });
}

/** An entry of one line that readers see. */
export async function publishedEntry(
  bench: ContentBench,
  builder: Person,
  place: { build: BuildPage; stage: StageView },
  title = "Setting out the frame",
): Promise<EntryDraft> {
  const draft = await startEntry(bench, builder, place, title);
  return (await publish(bench, builder, draft)).body;
}

export async function uploadFile(
  bench: ContentBench,
  builder: Person | null,
  bytes: Uint8Array<ArrayBuffer>,
  { name = "photo.jpg", ...fields }: { name?: string; purpose?: string; build?: string },
) {
  const form = new FormData();
  for (const [key, value] of Object.entries(fields)) form.set(key, value);
  form.set("photo", new File([bytes], name));
  const answer = await bench.fetchAs(builder, "/api/photos", { method: "POST", body: form });
  return { status: answer.status, body: await answer.json() };
}

/** A photo of a build with its pictures made. */
export async function readyPhoto(
  bench: ContentBench,
  builder: Person,
  build: BuildPage,
  bytes: Uint8Array<ArrayBuffer>,
): Promise<PhotoView> {
  const { body } = await uploadFile(bench, builder, bytes, { purpose: "entry", build: build.id });
  await bench.queue.runDue();
  return (await bench.send(builder, "GET", `/api/photos/${body.id}`)).body;
}
