import { rateLimit } from "express-rate-limit";
import { type Route, route } from "#server/http/endpoints.ts";
import { AppError } from "#server/http/errors.ts";
import { calculators } from "#shared/calculators/registry.ts";
import { listCalculators, workSum } from "#shared/contracts/calculators.ts";
import type { WorkingService } from "./service.ts";

/** The API of sums; templates are files and come from `templateFiles`. */
export function workingRoutes(workings: WorkingService): Route[] {
  return [
    route(listCalculators, () => ({
      items: calculators.map(({ words, ...rest }) => ({ ...rest, words: [...words] })),
    })),
    route(workSum, ({ params, body }) => ({ ...workings.work(params.calculator, body).results }), sumLimit()),
  ];
}

/** A person at the bench works in the browser; what comes here is programs, and they can wait. */
function sumLimit() {
  return rateLimit({
    windowMs: 60_000,
    limit: 120,
    standardHeaders: "draft-8",
    legacyHeaders: false,
    handler: () => {
      throw new AppError("rate_limited", "That is a lot of sums at once. Wait a minute and try again.");
    },
  });
}
