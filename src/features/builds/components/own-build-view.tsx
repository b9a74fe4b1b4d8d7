import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { Button } from "#src/components/button.tsx";
import { ErrorState } from "#src/components/error-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { LoadingState } from "#src/components/loading-state.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { useApi } from "#src/lib/api.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { paths } from "#src/lib/paths.ts";
import { ownBuildQuery } from "../queries.ts";
import { BuildAddressForm } from "./build-address-form.tsx";
import { BuildDetailsForm } from "./build-details-form.tsx";
import { CoverEditor } from "./cover-editor.tsx";
import { OwnEntries } from "./own-entries.tsx";
import { StageList } from "./stage-list.tsx";

interface OwnBuildViewProps {
  slug: string;
  /** Gets the build's new slug once its address has changed. */
  onMoved: (slug: string) => void;
  /** Gets the id of a draft just begun. */
  onBegun: (entryId: string) => void;
}

/** Everything a builder sets about one build. */
export function OwnBuildView({ slug, onMoved, onBegun }: OwnBuildViewProps) {
  const { data: build, error, refetch, dataUpdatedAt } = useQuery(ownBuildQuery(useApi(), slug));
  if (!build) {
    return (
      <div className="page-width py-10">
        {error ? (
          <ErrorState
            title="The build could not be read"
            action={<Button onClick={() => void refetch()}>Try again</Button>}
          >
            {messageOf(error)}
          </ErrorState>
        ) : (
          <LoadingState label="The build is on its way." />
        )}
      </div>
    );
  }
  return (
    <div className="page-width py-10">
      <title>{`${build.title}: workshop · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <OwnBuildHeading build={build} />
      <div className="grid items-start gap-x-14 gap-y-14 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <Part id="entries" title="Entries">
          <OwnEntries build={build} now={dataUpdatedAt} onBegun={onBegun} />
        </Part>
        <div className="flex flex-col gap-14">
          <Part id="stages" title="Stages">
            <StageList build={build} />
          </Part>
          <Part id="details" title="Details">
            <BuildDetailsForm build={build} />
          </Part>
          <Part id="cover" title="Cover">
            <CoverEditor build={build} />
          </Part>
          <Part id="address" title="Address">
            <BuildAddressForm slug={build.slug} onMoved={onMoved} />
          </Part>
        </div>
      </div>
    </div>
  );
}

const parts = [
  ["entries", "Entries"],
  ["stages", "Stages"],
  ["details", "Details"],
  ["cover", "Cover"],
  ["address", "Address"],
] as const;

function OwnBuildHeading({ build: { slug, title, purpose, lastEntryAt } }: { build: WorkshopBuild }) {
  return (
    <>
      <PageHeading
        title={title}
        purpose={purpose}
        above={<Breadcrumbs trail={[{ label: "Workshop", to: paths.workshop() }]} here={title} />}
        actions={
          lastEntryAt === null ? (
            <p className="max-w-64 text-xs text-ink-soft">
              Readers see this build once its first entry is public.
            </p>
          ) : (
            <LinkButton to={paths.build(slug)}>Read it as readers see it</LinkButton>
          )
        }
      />
      <nav aria-label="Parts of this page" className="-mt-6 mb-8 flex flex-wrap gap-x-5 lg:hidden">
        {parts.map(([id, label]) => (
          <a key={id} href={`#${id}`} className="inline-flex min-h-11 items-center">
            {label}
          </a>
        ))}
      </nav>
    </>
  );
}

interface PartProps {
  id: (typeof parts)[number][0];
  title: string;
  children: ReactNode;
}

function Part({ id, title, children }: PartProps) {
  return (
    <section id={id} aria-labelledby={`${id}-title`} className="min-w-0">
      <h2 id={`${id}-title`} className="mb-4">
        {title}
      </h2>
      {children}
    </section>
  );
}
