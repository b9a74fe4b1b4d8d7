import { Link } from "react-router";
import type { EndpointResponse } from "#shared/contracts/endpoint.ts";
import type { listOwnBuilds } from "#shared/contracts/entries.ts";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { MeaningTag } from "#src/components/meaning-tag.tsx";
import { paths } from "#src/lib/paths.ts";
import { buildStatusWords, counted } from "../state-words.ts";
import { CoverPhoto } from "./cover-photo.tsx";
import { StateTag } from "./state-tag.tsx";

export type OwnBuild = EndpointResponse<typeof listOwnBuilds>["builds"][number];

/** One of the person's own builds, with what waits in it. */
export function OwnBuildCard({ build, now }: { build: OwnBuild; now: number }) {
  const { slug, title, purpose, status, cover, coverAlt, entryCount, draftCount, lastEntryAt } = build;
  return (
    <article className="grid grid-cols-[6rem_1fr] items-start gap-4 border-b border-hairline py-5 sm:grid-cols-[12rem_1fr] sm:gap-6">
      <CoverPhoto photo={cover} alt={coverAlt} sizes="(min-width: 40rem) 12rem, 6rem" />
      <div className="flex min-w-0 flex-col gap-2">
        <h2 className="text-lg!">
          <Link to={paths.ownBuild(slug)}>{title}</Link>
        </h2>
        <p className="max-w-measure font-serif text-ink-soft">{purpose}</p>
        <div className="flex flex-wrap gap-1.5">
          <StateTag state={buildStatusWords[status]} />
          {draftCount > 0 ? (
            <MeaningTag tone="bronze" shape="file">
              {counted(draftCount, "draft", "drafts")}
            </MeaningTag>
          ) : null}
        </div>
        <p className="text-xs text-ink-soft">
          {entryCount === 0 ? "No public entry" : counted(entryCount, "public entry", "public entries")}
          {lastEntryAt === null ? null : (
            <>
              , the last on <DateStamp at={lastEntryAt} now={now} />
            </>
          )}
        </p>
        {lastEntryAt === null ? null : (
          <Link to={paths.build(slug)} className="inline-flex min-h-11 items-center self-start text-xs">
            Read {title} as readers see it
          </Link>
        )}
      </div>
    </article>
  );
}
