import { useSuspenseQuery } from "@tanstack/react-query";
import { clsx } from "clsx";
import { Link, type LoaderFunctionArgs, useSearchParams } from "react-router";
import type { BuildStatus } from "#shared/contracts/builds.ts";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { OlderLink } from "#src/components/older-link.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { BuildCard } from "#src/features/builds/components/build-card.tsx";
import { buildStatusWords } from "#src/features/builds/state-words.ts";
import { type BuildListQuery, buildsQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";

const statuses = Object.keys(buildStatusWords) as BuildStatus[];

/** What the address asks for; a status that does not exist asks for all. */
function queryOf(search: URLSearchParams): BuildListQuery {
  const status = statuses.find((each) => each === search.get("status"));
  const after = search.get("after");
  return { ...(status && { status }), ...(after && { after }) };
}

export async function load({ api, queryClient }: LoadContext, { request }: LoaderFunctionArgs) {
  await queryClient.ensureQueryData(buildsQuery(api, queryOf(new URL(request.url).searchParams)));
}

/** Every public build, the most recently written in first. */
export function Component() {
  const [search] = useSearchParams();
  const query = queryOf(search);
  const { data, dataUpdatedAt: now } = useSuspenseQuery(buildsQuery(useApi(), query));
  const older = data.next ? { ...(query.status && { status: query.status }), after: data.next } : null;
  return (
    <div className="page-width pt-8">
      <PageHead
        title="Builds"
        description="Machines being made, with every decision, sum and mistake written down."
        path={paths.builds()}
        feeds={{ title: "Soapstone: all entries", atom: paths.atomFeed(), json: paths.jsonFeed() }}
      />
      <PageHeading title="Builds" purpose="Machines being made. The one last written in comes first." />
      <StatusFilter chosen={query.status} />
      {data.items.length === 0 ? (
        <NoBuilds filtered={query.status !== undefined || query.after !== undefined} />
      ) : (
        <ul className="grid gap-x-8 gap-y-12 sm:grid-cols-2 lg:grid-cols-3">
          {data.items.map((build, index) => (
            <li key={build.id} className="flex *:flex-1">
              <BuildCard build={build} now={now} priority={index < 3 && query.after === undefined} />
            </li>
          ))}
        </ul>
      )}
      <OlderLink to={older && paths.buildsWith(older)}>Older builds</OlderLink>
    </div>
  );
}

function StatusFilter({ chosen }: { chosen: BuildStatus | undefined }) {
  const choices = [
    { label: "All", to: paths.builds(), here: chosen === undefined },
    ...statuses.map((status) => ({
      label: buildStatusWords[status].word,
      to: paths.buildsWith({ status }),
      here: chosen === status,
    })),
  ];
  return (
    <nav aria-label="Builds by status" className="mb-8">
      <ul className="-mx-3 flex flex-wrap">
        {choices.map(({ label, to, here }) => (
          <li key={to}>
            <Link
              to={to}
              aria-current={here ? "page" : undefined}
              className={clsx(
                "inline-flex min-h-11 items-center px-3 text-sm no-underline! hover:text-ink!",
                here ? "chalk-stroke font-semibold text-ink!" : "text-ink-soft!",
              )}
            >
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function NoBuilds({ filtered }: { filtered: boolean }) {
  if (filtered) {
    return (
      <EmptyState title="No builds here" action={<LinkButton to={paths.builds()}>See all builds</LinkButton>}>
        <p>No public build has this status now.</p>
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="No builds yet"
      action={
        <LinkButton tone="primary" to={paths.newBuild()}>
          Start a build
        </LinkButton>
      }
    >
      <p>Start one: give it a title and a line about what it is for. It shows here with its first entry.</p>
    </EmptyState>
  );
}
