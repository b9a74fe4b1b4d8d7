import { ownBuildsQuery } from "#src/features/builds/queries.ts";
import { buildsQuery, latestEntriesQuery } from "#src/features/reading/queries.ts";
import { paths } from "#src/lib/paths.ts";
import { meQuery, useViewer } from "#src/lib/viewer.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";
import { LatestBuilds } from "./home/latest-builds.tsx";
import { LatestEntries } from "./home/latest-entries.tsx";
import { LiveWorking } from "./home/live-working.tsx";
import { OwnWork } from "./home/own-work.tsx";
import { ForBuilders, WhatThisIs } from "./home/what-this-is.tsx";

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

/** The front page: for strangers what this is, for a signed-in person their own work first; then what is new. */
export function Component() {
  const viewer = useViewer();
  return (
    <div className="page-width pt-8 sm:pt-12">
      <PageHead
        title="Soapstone"
        description="Fabricators' build diaries with the numbers left in: every sum in them is live, so that a reader can check it before it is welded."
        path={paths.home()}
        feeds={{ title: "Soapstone: all entries", atom: paths.atomFeed(), json: paths.jsonFeed() }}
      />
      {viewer ? <OwnWork /> : <WhatThisIs />}
      <LatestEntries />
      <LatestBuilds />
      {viewer ? (
        <section aria-label="A working to try" className="mt-16 max-w-wide">
          <LiveWorking />
        </section>
      ) : (
        <ForBuilders />
      )}
    </div>
  );
}
