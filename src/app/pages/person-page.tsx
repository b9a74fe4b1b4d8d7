import { useSuspenseQuery } from "@tanstack/react-query";
import { type LoaderFunctionArgs, redirect, useParams, useSearchParams } from "react-router";
import { Avatar } from "#src/components/avatar.tsx";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { OlderLink } from "#src/components/older-link.tsx";
import { BuildCard } from "#src/features/builds/components/build-card.tsx";
import { buildsQuery, personQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { useViewer } from "#src/lib/viewer.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";

function listOf(handle: string, search: URLSearchParams) {
  const after = search.get("after");
  return { owner: handle, ...(after && { after }) };
}

export async function load({ api, queryClient }: LoadContext, { params, request }: LoaderFunctionArgs) {
  const handle = String(params.handle);
  const search = new URL(request.url).searchParams;
  const [person] = await Promise.all([
    queryClient.ensureQueryData(personQuery(api, handle)),
    queryClient.ensureQueryData(buildsQuery(api, listOf(handle, search))),
  ]);
  if (person.handle !== handle) throw redirect(paths.person(person.handle), 301);
}

/** Someone who builds or reads here, and their public builds. */
export function Component() {
  const api = useApi();
  const handle = String(useParams().handle);
  const [search] = useSearchParams();
  const { data: person } = useSuspenseQuery(personQuery(api, handle));
  const { data: builds, dataUpdatedAt: now } = useSuspenseQuery(buildsQuery(api, listOf(handle, search)));
  const mine = useViewer()?.handle === handle;
  const picture = person.avatar?.webp[0]?.url;
  const older = builds.next ? `${paths.person(handle)}?${new URLSearchParams({ after: builds.next })}` : null;
  return (
    <div className="page-width pt-8">
      <PageHead
        title={person.name}
        description={person.bio || `${person.name} on Soapstone.`}
        path={paths.person(handle)}
        type="profile"
        image={{ photo: person.avatar, alt: `Picture of ${person.name}` }}
      />
      <header className="mb-10 flex flex-wrap items-start gap-x-6 gap-y-4 border-b border-hairline pb-8">
        <Avatar name={person.name} size="large" {...(picture && { src: picture })} />
        <div className="min-w-0 flex-1 basis-72">
          <h1>{person.name}</h1>
          <p className="mt-1 text-xs text-ink-soft">
            <span className="figures">@{person.handle}</span> · here since{" "}
            <DateStamp at={person.since} now={now} />
          </p>
          {person.bio ? <p className="mt-4 max-w-measure font-serif text-base">{person.bio}</p> : null}
          {mine ? (
            <p className="mt-4">
              <LinkButton to={paths.account()}>Edit your profile</LinkButton>
            </p>
          ) : null}
        </div>
      </header>
      <section aria-labelledby="builds">
        <h2 id="builds" className="mb-6">
          Builds
        </h2>
        {builds.items.length === 0 ? (
          <NoBuilds name={person.name} mine={mine} />
        ) : (
          <ul className="grid gap-x-8 gap-y-12 sm:grid-cols-2 lg:grid-cols-3">
            {builds.items.map((build) => (
              <li key={build.id} className="flex *:flex-1">
                <BuildCard build={build} now={now} level={3} withOwner={false} />
              </li>
            ))}
          </ul>
        )}
        <OlderLink to={older}>Older builds</OlderLink>
      </section>
    </div>
  );
}

function NoBuilds({ name, mine }: { name: string; mine: boolean }) {
  if (!mine) {
    return (
      <EmptyState title="No public builds">
        <p>{name} reads here and has published no build of their own.</p>
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="No public builds yet"
      action={
        <LinkButton tone="primary" to={paths.newBuild()}>
          Start a build
        </LinkButton>
      }
    >
      <p>A build shows here with its first public entry.</p>
    </EmptyState>
  );
}
