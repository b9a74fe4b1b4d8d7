import { queryOptions } from "@tanstack/react-query";
import type { listCalculators } from "#shared/contracts/calculators.ts";
import type { Api } from "#src/lib/api.ts";

/** Every calculator by name and purpose; the calculators themselves come with their own pages. */
export function calculatorsQuery(api: Api) {
  return queryOptions({
    queryKey: ["calculators"],
    queryFn: () => api.call<typeof listCalculators>("GET /api/calculators", {}),
    staleTime: Number.POSITIVE_INFINITY,
  });
}
