import { useQuery, useSuspenseQuery } from "@tanstack/react-query";
import { Link } from "react-router";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { BuildCard } from "#src/features/builds/components/build-card.tsx";
import { EntryRow } from "#src/features/builds/components/entry-row.tsx";
import { OwnBuildsStrip } from "#src/features/builds/components/own-builds-strip.tsx";
import { ownBuildsQuery } from "#src/features/builds/queries.ts";
import { buildsQuery, latestEntriesQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { Island } from "#src/lib/island.tsx";
import { useUnits } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { meQuery, useViewer } from "#src/lib/viewer.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";
import { workingPanel } from "../working-island.ts";

const description =
  "Fabricators' build diaries with the numbers left in: every sum is live, so a reader can check it before it is welded.";

/** A working that anyone can try: a branch at a slant on a rail, mm and degrees. */
const tryThis = { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60, offset: 0 };

/** How many of each list the front page shows. */
const shown = { entries: 5, builds: 3 };

export async function load({ api, queryClient }: LoadContext) {
  const own = queryClient.ensureQueryData(meQuery(api)).then(async (me) => {
    if (me) await queryClient.ensureQueryData(ownBuildsQuery(api));
  });
  await Promise.all([
    own,
    queryClient.ensureQueryData(latestEntriesQuery(api)),
    queryClient.ensureQueryData(buildsQuery(api)),
  ]);
}

/** What this is, shown by a working that works; then what is new. */
export function Component() {
  const viewer = useViewer();
  return (
    <div className="page-width pt-8 sm:pt-12">
      <PageHead
        title="Soapstone"
        description={description}
        path={paths.home()}
        feeds={{ title: "Soapstone: all entries", atom: paths.atomFeed(), json: paths.jsonFeed() }}
      />
      {viewer ? <OwnWork /> : <WhatThisIs />}
      <Latest />
      <Builds />
      {viewer ? <TryOne /> : <ForBuilders />}
    </div>
  );
}

function WhatThisIs() {
  return (
    <section className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,20rem)_minmax(0,1fr)]">
      <div>
        <h1>Build diaries with the numbers left in</h1>
        <p className="mt-5 font-serif text-base">
          People who make one-off machines write up each stage here and keep the sums in the text. This is
          one: the cut that seats one tube on another.{" "}
          <strong>Change a number and the drawing follows.</strong>
        </p>
        <p className="mt-3 font-serif text-base text-ink-soft">
          Every working in an entry is like it. Try your own tubes, print the template at full size, and say
          so if a number is wrong, before it is welded.
        </p>
        <div className="mt-6 flex flex-wrap gap-2">
          <LinkButton tone="primary" to={paths.builds()}>
            Read a build
          </LinkButton>
          <LinkButton to={paths.signUp()}>Keep a diary of your own</LinkButton>
        </div>
      </div>
      <LiveWorking />
    </section>
  );
}

function LiveWorking() {
  const units = useUnits();
  return (
    <Island
      source={workingPanel}
      props={{ calculator: "saddle-cope", title: "A branch at 60° on a rail", inputs: tryThis, units }}
    />
  );
}

function OwnWork() {
  const { data } = useQuery(ownBuildsQuery(useApi()));
  return (
    <section aria-labelledby="own-work">
      <div className="mb-5 flex flex-wrap items-end justify-between gap-4">
        <h1 id="own-work">Your builds</h1>
        <div className="flex flex-wrap gap-2">
          <LinkButton tone="primary" to={paths.workshop()}>
            Go to your workshop
          </LinkButton>
        </div>
      </div>
      {data ? <OwnBuildsStrip builds={data.builds} /> : null}
    </section>
  );
}

function Latest() {
  const { data, dataUpdatedAt: now } = useSuspenseQuery(latestEntriesQuery(useApi()));
  return (
    <section aria-labelledby="latest" className="mt-16">
      <h2 id="latest">Latest entries</h2>
      {data.items.length === 0 ? (
        <div className="mt-5">
          <EmptyState
            title="Nobody has published an entry yet"
            action={<LinkButton to={paths.newBuild()}>Start a build</LinkButton>}
          >
            <p>The first one will stand here.</p>
          </EmptyState>
        </div>
      ) : (
        <ol className="mt-3 divide-y divide-hairline border-t border-edge">
          {data.items.slice(0, shown.entries).map((entry) => (
            <li key={entry.id}>
              <EntryRow
                build={entry.build.slug}
                entry={entry}
                now={now}
                from={
                  <>
                    <Link to={paths.build(entry.build.slug)}>{entry.build.title}</Link> by{" "}
                    {entry.build.owner.name}
                  </>
                }
              />
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

function Builds() {
  const { data, dataUpdatedAt: now } = useSuspenseQuery(buildsQuery(useApi()));
  if (data.items.length === 0) return null;
  return (
    <section aria-labelledby="builds" className="mt-16">
      <div className="mb-5 flex flex-wrap items-baseline justify-between gap-4">
        <h2 id="builds">Builds</h2>
        <Link to={paths.builds()} className="inline-flex min-h-11 items-center text-sm">
          All builds
        </Link>
      </div>
      <ul className="grid gap-x-8 gap-y-12 sm:grid-cols-2 lg:grid-cols-3">
        {data.items.slice(0, shown.builds).map((build) => (
          <li key={build.id} className="flex *:flex-1">
            <BuildCard build={build} now={now} level={3} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function TryOne() {
  return (
    <section aria-labelledby="try" className="mt-16">
      <h2 id="try" className="mb-5">
        A sum to hand
      </h2>
      <LiveWorking />
    </section>
  );
}

function ForBuilders() {
  return (
    <section aria-labelledby="for-builders" className="mt-16 border-t border-edge pt-6">
      <h2 id="for-builders">Making something?</h2>
      <p className="mt-3 max-w-measure font-serif text-base">
        Write it up as you go, from a phone if that is what is in the workshop. Drop in photos, work the sums
        where they belong, and readers will check them with you. Reading needs no account; writing does.
      </p>
      <p className="mt-4">
        <LinkButton to={paths.signUp()}>Sign up</LinkButton>
      </p>
    </section>
  );
}
