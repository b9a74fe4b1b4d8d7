import { type Route, route } from "#server/http/endpoints.ts";
import { signedIn } from "#server/http/policy.ts";
import {
  createBuild,
  createStage,
  deleteStage,
  getBuild,
  listBuilds,
  orderStages,
  updateBuild,
  updateStage,
} from "#shared/contracts/builds.ts";
import type { BuildService } from "./service.ts";
import type { StageService } from "./stages.ts";

/** The API of builds and their stages. */
export function buildRoutes(builds: BuildService, stages: StageService): Route[] {
  return [
    route(listBuilds, ({ query }) => builds.list(query)),
    route(getBuild, ({ params }, { viewer }) => builds.get(viewer, params.build)),
    route(createBuild, ({ body }, { viewer }) => builds.create(signedIn(viewer), body)),
    route(updateBuild, ({ params, body }, { viewer }) => builds.update(signedIn(viewer), params.build, body)),
    route(createStage, ({ params, body }, { viewer }) => stages.create(signedIn(viewer), params.build, body)),
    route(updateStage, ({ params, body }, { viewer }) => stages.update(signedIn(viewer), params.stage, body)),
    route(deleteStage, ({ params }, { viewer }) => {
      stages.remove(signedIn(viewer), params.stage);
      return { done: true as const };
    }),
    route(orderStages, ({ params, body }, { viewer }) => ({
      stages: stages.order(signedIn(viewer), params.build, body.stages),
    })),
  ];
}
