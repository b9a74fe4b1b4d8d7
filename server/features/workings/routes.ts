import { type Route, route } from "#server/http/endpoints.ts";
import { workSum } from "#shared/contracts/calculators.ts";
import type { WorkingService } from "./service.ts";

/** The API of sums; templates are files and come from `templateFiles`. */
export function workingRoutes(workings: WorkingService): Route[] {
  return [route(workSum, ({ params, body }) => ({ ...workings.work(params.calculator, body).results }))];
}
