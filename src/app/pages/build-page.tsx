import { useSuspenseQuery } from "@tanstack/react-query";
import { type LoaderFunctionArgs, redirect, useParams } from "react-router";
import type { BuildPage } from "#shared/contracts/builds.ts";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { PersonLink } from "#src/components/person-link.tsx";
import { StoredPhoto } from "#src/components/stored-photo.tsx";
import { BuildRule } from "#src/features/builds/components/build-rule.tsx";
import { StageSection } from "#src/features/builds/components/stage-section.tsx";
import { StartReading } from "#src/features/builds/components/start-reading.tsx";
import { StateTag } from "#src/features/builds/components/state-tag.tsx";
import { entriesByStage } from "#src/features/builds/stage-entries.ts";
import { buildStatusWords, counted } from "#src/features/builds/state-words.ts";
import { buildQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";

export async function load({ api, queryClient }: LoadContext, { params }: LoaderFunctionArgs) {
  const slug = String(params.build);
  const build = await queryClient.ensureQueryData(buildQuery(api, slug));
  if (build.slug !== slug) throw redirect(paths.build(build.slug), 301);
}

/** A build: what it is, its time line, and its stages with their entries. */
export function Component() {
  const params = useParams();
  const { data: build, dataUpdatedAt: now } = useSuspenseQuery(buildQuery(useApi(), String(params.build)));
  return (
    <div className="page-width pt-4">
      <PageHead
        title={build.title}
        description={build.purpose}
        path={paths.build(build.slug)}
        image={{ photo: build.cover, alt: build.coverAlt }}
        feeds={{
          title: `${build.title} on Soapstone`,
          atom: paths.buildAtomFeed(build.slug),
          json: paths.buildJsonFeed(build.slug),
        }}
      />
      <Breadcrumbs trail={[{ label: "Builds", to: paths.builds() }]} here={build.title} />
      <BuildHead build={build} now={now} />
      {build.entries.length === 0 ? <NothingYet build={build} /> : <BuildBody build={build} now={now} />}
    </div>
  );
}

function BuildHead({ build, now }: { build: BuildPage; now: number }) {
  return (
    <header className="mt-3 grid items-end gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,5fr)_minmax(0,7fr)]">
      {build.cover ? (
        <div className="lg:order-2">
          <StoredPhoto
            photo={build.cover}
            alt={build.coverAlt}
            sizes="(min-width: 75rem) 42rem, (min-width: 64rem) 56vw, 100vw"
            className="bleed"
            crop="3/2"
            priority
          />
        </div>
      ) : null}
      <div className="min-w-0">
        <StateTag state={buildStatusWords[build.status]} />
        <h1 className="mt-3">{build.title}</h1>
        <p className="mt-3 font-serif text-lg leading-snug text-ink-soft">{build.purpose}</p>
        <div className="mt-4 text-sm">
          <PersonLink person={build.owner} />
          <p className="text-xs text-ink-soft">
            Begun <DateStamp at={build.createdAt} now={now} />
            <br />
            {counted(build.entryCount, "entry", "entries")}
            {build.lastEntryAt === null ? null : (
              <>
                , the last <DateStamp at={build.lastEntryAt} now={now} />
              </>
            )}
          </p>
        </div>
        <div className="no-print mt-5 flex flex-wrap gap-2">
          <StartReading build={build} />
          {build.mine ? <LinkButton to={paths.ownBuild(build.slug)}>Edit this build</LinkButton> : null}
        </div>
      </div>
    </header>
  );
}

function BuildBody({ build, now }: { build: BuildPage; now: number }) {
  return (
    <>
      <section aria-labelledby="time-line" className="mt-14">
        <h2 id="time-line" className="mb-4">
          Time line
        </h2>
        <BuildRule build={build} />
      </section>
      <section aria-labelledby="stages" className="mt-14">
        <h2 id="stages" className="mb-6">
          Stages and entries
        </h2>
        <div className="flex flex-col gap-8">
          {entriesByStage(build.stages, build.entries).map((group) => (
            <StageSection key={group.stage.id} build={build.slug} group={group} now={now} />
          ))}
        </div>
      </section>
      <p className="mt-12 border-t border-hairline pt-4 text-sm text-ink-soft">
        Follow {build.title} in a feed reader: <a href={paths.buildAtomFeed(build.slug)}>Atom feed</a> or{" "}
        <a href={paths.buildJsonFeed(build.slug)}>JSON feed</a>.
      </p>
    </>
  );
}

function NothingYet({ build }: { build: BuildPage }) {
  return (
    <div className="mt-12">
      {build.mine ? (
        <EmptyState
          title="Nothing is published yet"
          action={
            <LinkButton tone="primary" to={paths.ownBuild(build.slug)}>
              Write the first entry
            </LinkButton>
          }
        >
          <p>Until an entry is public, only you can see this page.</p>
        </EmptyState>
      ) : (
        <EmptyState title="Nothing is published yet">
          <p>{build.owner.name} has not written about this build so far.</p>
        </EmptyState>
      )}
    </div>
  );
}
