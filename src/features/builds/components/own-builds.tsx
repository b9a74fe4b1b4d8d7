import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { Button } from "#src/components/button.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { ErrorState } from "#src/components/error-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { LoadingState } from "#src/components/loading-state.tsx";
import { useApi } from "#src/lib/api.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { paths } from "#src/lib/paths.ts";
import { ownBuildsQuery } from "../queries.ts";
import { OwnBuildCard } from "./own-build-card.tsx";
import { ScheduledEntries } from "./scheduled-entries.tsx";

/** The person's builds. `notYet` stands in place of the way to begin while they may not start one. */
export function OwnBuilds({ notYet }: { notYet: ReactNode }) {
  const { data, error, refetch, dataUpdatedAt } = useQuery(ownBuildsQuery(useApi()));
  if (!data) {
    if (!error) return <LoadingState label="Your builds are on their way." />;
    return (
      <ErrorState
        title="Your builds could not be read"
        action={<Button onClick={() => void refetch()}>Try again</Button>}
      >
        {messageOf(error)}
      </ErrorState>
    );
  }
  if (data.builds.length === 0) {
    return (
      <div className="flex flex-col gap-6">
        {notYet}
        <EmptyState
          title="No build yet"
          action={
            notYet ? null : (
              <LinkButton to={paths.newBuild()} tone="primary">
                Start a build
              </LinkButton>
            )
          }
        >
          A build is one machine being made. Whoever starts one is a builder: give it a title and a line that
          says what it is for, then add its stages and write the first entry. Nobody sees it until you
          publish.
        </EmptyState>
      </div>
    );
  }
  return (
    <div className="grid gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,1fr)_20rem]">
      <div>
        {notYet}
        {data.builds.map((build) => (
          <OwnBuildCard key={build.id} build={build} now={dataUpdatedAt} />
        ))}
      </div>
      <ScheduledEntries entries={data.scheduled} now={dataUpdatedAt} />
    </div>
  );
}
