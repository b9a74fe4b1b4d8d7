import { Link } from "react-router";
import type { BuildSummary } from "#shared/contracts/builds.ts";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { paths } from "#src/lib/paths.ts";
import { buildStatusWords, counted } from "../state-words.ts";
import { StateTag } from "./state-tag.tsx";

interface OwnBuildsStripProps {
  builds: (BuildSummary & { draftCount: number })[];
}

/** One's own builds in a few lines, each with what waits there. */
export function OwnBuildsStrip({ builds }: OwnBuildsStripProps) {
  if (builds.length === 0) {
    return (
      <EmptyState
        title="You have no build yet"
        action={<LinkButton to={paths.newBuild()}>Start a build</LinkButton>}
      >
        <p>Making something? Start a build and write up what you have done so far.</p>
      </EmptyState>
    );
  }
  return (
    <ul className="divide-y divide-hairline border-y border-edge">
      {builds.map((build) => (
        <li key={build.id} className="flex flex-wrap items-center justify-between gap-x-6 gap-y-1 py-2">
          <Link to={paths.ownBuild(build.slug)} className="inline-flex min-h-11 items-center font-semibold">
            {build.title}
          </Link>
          <span className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm text-ink-soft">
            {build.draftCount > 0 ? (
              <span className="font-semibold text-bronze">
                {counted(build.draftCount, "draft", "drafts")}
              </span>
            ) : null}
            {counted(build.entryCount, "public entry", "public entries")}
            <StateTag state={buildStatusWords[build.status]} />
          </span>
        </li>
      ))}
    </ul>
  );
}
