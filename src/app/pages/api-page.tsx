import { queryOptions, useSuspenseQuery } from "@tanstack/react-query";
import type { getApiDescription } from "#shared/contracts/api-description.ts";
import { PageHeading } from "#src/components/page-heading.tsx";
import { type Api, useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";
import { ApiOperation, type Operation } from "./api/operation.tsx";

function descriptionQuery(api: Api) {
  return queryOptions({
    queryKey: ["api-description"],
    queryFn: () => api.call<typeof getApiDescription>("GET /api/openapi.json", {}),
    staleTime: Number.POSITIVE_INFINITY,
  });
}

export async function load({ api, queryClient }: LoadContext) {
  await queryClient.ensureQueryData(descriptionQuery(api));
}

/** The API, readable: the same document that machines fetch. */
export function Component() {
  const { data } = useSuspenseQuery(descriptionQuery(useApi()));
  const all = Object.entries(data.paths as Record<string, Record<string, Operation>>).flatMap(
    ([path, methods]) => Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
  );
  const isSum = ({ operation }: { operation: Operation }) => operation.tags?.includes("calculators") === true;
  const runs = [
    { title: "Sums", operations: all.filter(isSum) },
    { title: "Everything else", operations: all.filter((each) => !isSum(each)) },
  ];
  const { description } = data.info as { description: string };
  return (
    <div className="page-width pt-8">
      <PageHead
        title="API"
        description="Every address of the Soapstone API, with what it takes and gives."
        path={paths.api()}
      />
      <PageHeading title="API" purpose={description} />
      <p className="mb-8 font-sans text-sm">
        For machines: <a href={paths.apiDescription()}>the OpenAPI 3.1 document</a>.
      </p>
      {runs.map(({ title, operations }) => (
        <section key={title} aria-label={title} className="mb-10">
          <h2 className="mb-3 text-lg">{title}</h2>
          <div className="-space-y-px">
            {operations.map(({ path, method, operation }) => (
              <ApiOperation key={method + path} path={path} method={method} operation={operation} />
            ))}
          </div>
        </section>
      ))}
    </div>
  );
}
