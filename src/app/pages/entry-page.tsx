import { useSuspenseQuery } from "@tanstack/react-query";
import { useEffect, useMemo } from "react";
import { type LoaderFunctionArgs, redirect, useParams } from "react-router";
import { DocumentView } from "#src/editor/document-view.tsx";
import { EntryHead } from "#src/features/reading/components/entry-head.tsx";
import { SeriesNav } from "#src/features/reading/components/series-nav.tsx";
import { EntryMediaProvider, entryMedia } from "#src/features/reading/entry-media.ts";
import { entryJsonLd, jsonForScript } from "#src/features/reading/json-ld.ts";
import { entryQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { usePageSettings } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { keepPlace } from "#src/lib/reading-place.ts";
import { entrySlots } from "../entry-slots.tsx";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";

export async function load({ api, queryClient }: LoadContext, { params }: LoaderFunctionArgs) {
  const [build, slug] = [String(params.build), String(params.entry)];
  const entry = await queryClient.ensureQueryData(entryQuery(api, build, slug));
  if (entry.build.slug !== build || entry.slug !== slug) {
    throw redirect(paths.entry(entry.build.slug, entry.slug), 301);
  }
}

/** The reading page: one entry, its margin, and the way on through the series. */
export function Component() {
  const params = useParams();
  const query = entryQuery(useApi(), String(params.build), String(params.entry));
  const { data: entry, dataUpdatedAt: now } = useSuspenseQuery(query);
  const { siteUrl } = usePageSettings();
  const media = useMemo(() => entryMedia(entry), [entry]);
  const { build } = entry;
  useEffect(() => keepPlace(build.id, entry.id), [build.id, entry.id]);
  return (
    <div className="page-width pt-4">
      <PageHead
        title={`${entry.title} · ${build.title}`}
        description={entry.summary || build.purpose}
        path={paths.entry(build.slug, entry.slug)}
        type="article"
        image={{ photo: entry.photo ?? build.cover, alt: entry.photo ? entry.photoAlt : build.coverAlt }}
        feeds={{
          title: `${build.title} on Soapstone`,
          atom: paths.buildAtomFeed(build.slug),
          json: paths.buildJsonFeed(build.slug),
        }}
      />
      <script type="application/ld+json">{jsonForScript(entryJsonLd(entry, siteUrl))}</script>
      <article>
        <EntryHead entry={entry} now={now} />
        <div className="entry-column prose">
          <EntryMediaProvider value={media}>
            <DocumentView document={entry.document} slots={entrySlots} />
          </EntryMediaProvider>
        </div>
      </article>
      <SeriesNav entry={entry} />
    </div>
  );
}
