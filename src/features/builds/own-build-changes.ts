import type { BuildPage, StageState, StageView } from "#shared/contracts/builds.ts";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";

/** Pure changes of an own build: made at once on the screen, before the server has answered. */

export function withStageChanged(
  build: WorkshopBuild,
  id: string,
  change: { title?: string; state?: StageState },
): WorkshopBuild {
  return {
    ...build,
    stages: build.stages.map((stage) => (stage.id === id ? { ...stage, ...change } : stage)),
  };
}

export function withStageAdded(build: WorkshopBuild, stage: StageView): WorkshopBuild {
  return { ...build, stages: [...build.stages.filter(({ id }) => id !== stage.id), stage] };
}

export function withoutStage(build: WorkshopBuild, id: string): WorkshopBuild {
  return { ...build, stages: build.stages.filter((stage) => stage.id !== id) };
}

/** Stages that the order does not name, such as one added in another tab, keep their order at the end. */
export function withStagesOrdered(build: WorkshopBuild, ids: string[]): WorkshopBuild {
  const place = new Map(ids.map((id, index) => [id, index]));
  const placeOf = ({ id }: StageView) => place.get(id) ?? ids.length;
  return { ...build, stages: build.stages.toSorted((a, b) => placeOf(a) - placeOf(b)) };
}

/** Takes over what the server answered; stages and entries stay, as the answer lists the public ones alone. */
export function withAnswer(
  build: WorkshopBuild,
  { slug, title, purpose, status, cover, coverAlt }: BuildPage,
): WorkshopBuild {
  return { ...build, slug, title, purpose, status, cover, coverAlt };
}
