import { useQuery } from "@tanstack/react-query";
import { clsx } from "clsx";
import type { ReactNode } from "react";
import { Link } from "react-router";
import type { EntryDraft, RevisionSummary } from "#shared/contracts/entries.ts";
import type { RichDocument } from "#shared/document/types.ts";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { Button } from "#src/components/button.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { ErrorState } from "#src/components/error-state.tsx";
import { LoadingState } from "#src/components/loading-state.tsx";
import { Notice } from "#src/components/notice.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { Tabs } from "#src/components/tabs.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { momentInWords } from "../moments.ts";
import { revisionQuery, revisionsQuery, useRestoreRevision } from "../queries.ts";
import { TextChanges } from "./text-changes.tsx";

/** What a revision is shown with. */
export interface ShownRevision {
  document: EntryDraft["document"];
  workings: EntryDraft["workings"];
  photos: EntryDraft["photos"];
}

interface EntryHistoryProps {
  draft: EntryDraft;
  /** The number of the revision to show; the newest without it. */
  chosen: number | null;
  renderDocument(revision: ShownRevision): ReactNode;
  onRestored(): void;
}

/** An entry's kept revisions: what each said, how it differs from now, and the way back to it. */
export function EntryHistory({ draft, chosen, renderDocument, onRestored }: EntryHistoryProps) {
  const { data: revisions, error, refetch } = useQuery(revisionsQuery(useApi(), draft.id));
  const shown = chosen ?? revisions?.[0]?.number ?? null;
  return (
    <div className="page-width py-10">
      <title>{`History of ${draft.title || "an entry"} · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <PageHeading
        title="History"
        above={
          <Breadcrumbs
            trail={[
              { label: draft.build.title, to: paths.ownBuild(draft.build.slug) },
              { label: draft.title || "Untitled entry", to: paths.entryEditor(draft.id) },
            ]}
            here="History"
          />
        }
        purpose="Every state of this entry that was kept. Going back to one keeps the present one too."
      />
      {error ? (
        <ErrorState
          title="The history could not be read"
          action={<Button onClick={() => void refetch()}>Try again</Button>}
        >
          {error.message}
        </ErrorState>
      ) : null}
      {!revisions && !error ? <LoadingState label="The history is on its way." /> : null}
      {revisions?.length === 0 ? (
        <EmptyState title="Nothing kept yet">Write something: each save is kept here.</EmptyState>
      ) : null}
      {revisions && shown !== null ? (
        <div className="grid items-start gap-10 lg:grid-cols-[18rem_minmax(0,1fr)]">
          <RevisionList entry={draft.id} revisions={revisions} shown={shown} />
          <Revision draft={draft} number={shown} renderDocument={renderDocument} onRestored={onRestored} />
        </div>
      ) : null}
    </div>
  );
}

const reasons: Record<RevisionSummary["reason"], string> = {
  autosave: "Saved while writing",
  publish: "Published",
  restore: "Brought back from the history",
};

interface RevisionListProps {
  entry: string;
  revisions: RevisionSummary[];
  shown: number;
}

function RevisionList({ entry, revisions, shown }: RevisionListProps) {
  return (
    <nav
      aria-label="Revisions"
      className="max-h-72 overflow-y-auto border-y border-hairline lg:max-h-[70dvh]"
    >
      <ol className="divide-y divide-hairline">
        {revisions.map(({ number, createdAt, reason, words }) => (
          <li key={number}>
            <Link
              to={`${paths.entryHistory(entry)}?revision=${number}`}
              preventScrollReset
              aria-current={number === shown ? "true" : undefined}
              className={clsx(
                "block min-h-11 border-l-[3px] px-3 py-2 text-sm text-ink! no-underline! hover:bg-grey-wash",
                number === shown ? "border-temper bg-temper-wash" : "border-transparent",
              )}
            >
              <span className="block font-semibold">{momentInWords(createdAt, Date.now())}</span>
              <span className="block text-ink-soft">
                {reasons[reason]}, <span className="figures">{words}</span> words
              </span>
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}

interface RevisionProps extends Omit<EntryHistoryProps, "chosen"> {
  number: number;
}

function Revision({ draft, number, renderDocument, onRestored }: RevisionProps) {
  const { data: revision, error } = useQuery(revisionQuery(useApi(), draft.id, number));
  const restore = useRestoreRevision(draft.id);
  if (error) return <ErrorState title="This revision could not be read">{error.message}</ErrorState>;
  if (!revision) return <LoadingState label="The revision is on its way." lines={8} />;
  const bringBack = async () => {
    await restore.mutateAsync(number);
    toasts.show({
      kind: "success",
      message: "The entry is back at this revision. What it said before is kept too.",
    });
    onRestored();
  };
  return (
    <section aria-labelledby="revision-title" className="flex min-w-0 flex-col gap-5">
      <div className="flex flex-wrap items-start justify-between gap-4">
        <div className="min-w-0 flex-1 basis-64">
          <h2 id="revision-title">{revision.title || "Untitled"}</h2>
          {revision.summary ? <p className="mt-2 text-ink-soft">{revision.summary}</p> : null}
        </div>
        <Button
          busy={restore.isPending}
          busyLabel="Going back…"
          onClick={() => void bringBack().catch(() => undefined)}
        >
          Go back to this
        </Button>
      </div>
      {restore.error ? (
        <Notice kind="error" role="alert">
          {restore.error.message}
        </Notice>
      ) : null}
      <Tabs
        label="How to look at it"
        tabs={[
          { value: "then", label: "As it was", content: renderDocument(revision) },
          {
            value: "changes",
            label: "What changed since",
            content: (
              <TextChanges
                before={revision.document as RichDocument}
                after={draft.document as RichDocument}
              />
            ),
          },
        ]}
      />
    </section>
  );
}
