import { type Route, route } from "#server/http/endpoints.ts";
import { calculators } from "#shared/calculators/registry.ts";
import { listCalculators, workSum } from "#shared/contracts/calculators.ts";
import type { WorkingService } from "./service.ts";

/** The API of sums; templates are files and come from `templateFiles`. */
export function workingRoutes(workings: WorkingService): Route[] {
  return [
    route(listCalculators, () => ({
      items: calculators.map(({ words, ...rest }) => ({ ...rest, words: [...words] })),
    })),
    route(workSum, ({ params, body }) => ({ ...workings.work(params.calculator, body).results })),
  ];
}
