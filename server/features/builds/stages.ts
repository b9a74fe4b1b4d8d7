import { v7 as uuid } from "uuid";
import { recordAudit } from "#server/db/audit.ts";
import type { Connection, Database } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import type { StageState, StageView } from "#shared/contracts/builds.ts";
import type { BuildReader } from "./reader.ts";
import { findOwnBuild } from "./service.ts";
import {
  deleteStageRow,
  findStage,
  insertStageLast,
  setStageOrder,
  stageHoldsEntries,
  updateStageRow,
} from "./stage-repository.ts";

export type StageService = ReturnType<typeof createStageService>;

/** A build's stages, in the maker's own order. */
export function createStageService({
  database,
  clock,
  reader,
}: {
  database: Database;
  clock: () => number;
  reader: BuildReader;
}) {
  function create(viewer: Person, slug: string, body: { title: string; state: StageState }): StageView {
    return database.transaction((tx) => {
      const build = findOwnBuild(tx, viewer, slug);
      const id = uuid();
      insertStageLast(tx, { id, buildId: build.id, ...body });
      audit(tx, viewer, "stage.create", id);
      return { id, ...body, entryCount: 0 };
    });
  }

  function update(
    viewer: Person,
    id: string,
    change: { title?: string | undefined; state?: StageState | undefined },
  ): StageView {
    return database.transaction((tx) => {
      const stage = findOwnStage(tx, viewer, id);
      const next = { title: change.title ?? stage.title, state: change.state ?? stage.state };
      updateStageRow(tx, id, next);
      audit(tx, viewer, "stage.update", id);
      const view = reader.stagesOf(stage.buildId, "all", tx).find((each) => each.id === id);
      if (!view) throw noSuchStage();
      return view;
    });
  }

  function remove(viewer: Person, id: string): void {
    database.transaction((tx) => {
      findOwnStage(tx, viewer, id);
      if (stageHoldsEntries(tx, id)) {
        throw new AppError("conflict", "This stage holds entries. Move them to another stage first.");
      }
      deleteStageRow(tx, id);
      audit(tx, viewer, "stage.delete", id);
    });
  }

  /** The list must name every stage of the build once: an order made from a stale page changes nothing. */
  function order(viewer: Person, slug: string, ids: string[]): StageView[] {
    return database.transaction((tx) => {
      const build = findOwnBuild(tx, viewer, slug);
      const present = reader.stagesOf(build.id, "all", tx);
      const given = new Set(ids);
      const sameStages = ids.length === present.length && present.every(({ id }) => given.has(id));
      if (!sameStages) {
        throw new AppError(
          "conflict",
          "The stages have changed meanwhile. Load the page again, then order them.",
        );
      }
      setStageOrder(tx, build.id, ids);
      recordAudit(tx, {
        at: clock(),
        actorId: viewer.id,
        action: "build.order_stages",
        subjectKind: "build",
        subjectId: build.id,
      });
      return reader.stagesOf(build.id, "all", tx);
    });
  }

  function audit(tx: Connection, viewer: Person, action: string, id: string): void {
    recordAudit(tx, { at: clock(), actorId: viewer.id, action, subjectKind: "stage", subjectId: id });
  }

  return { create, update, remove, order };
}

/** Stages of other people's builds are answered as if there were none: their ids stand on no page. */
function findOwnStage(connection: Connection, viewer: Person, id: string) {
  const found = findStage(connection, id);
  if (found?.ownerId !== viewer.id) throw noSuchStage();
  return found.stage;
}

function noSuchStage(): AppError {
  return new AppError("not_found", "There is no such stage in your workshop.");
}
