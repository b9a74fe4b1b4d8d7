import { useState } from "react";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { Button } from "#src/components/button.tsx";
import { Disclosure } from "#src/components/disclosure.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { Mark } from "#src/components/mark.tsx";
import { Notice } from "#src/components/notice.tsx";
import { paths } from "#src/lib/paths.ts";
import { beforePublishing } from "../before-publishing.ts";
import { momentInWords } from "../moments.ts";
import type { OpenDraft } from "../use-draft.ts";
import type { Publishing } from "../use-publishing-acts.ts";
import { AddressForm } from "./address-form.tsx";
import { ConfirmDialog } from "./confirm-dialog.tsx";
import { EntryStateTag } from "./entry-state-tag.tsx";
import { ScheduleDialog } from "./schedule-dialog.tsx";

interface PublishPanelProps {
  draft: EntryDraft;
  open: OpenDraft;
  publishing: Publishing;
  onDelete(): Promise<unknown>;
}

/** Who sees the entry, from when, under which address, and what changes that. */
export function PublishPanel({ draft, open, publishing, onDelete }: PublishPanelProps) {
  const [dialog, setDialog] = useState<"schedule" | "withdraw" | "delete" | null>(null);
  const { state, scheduledAt, publishedAt } = draft;
  const close = () => setDialog(null);
  const lacking = beforePublishing(open.content);
  return (
    <section aria-labelledby="publishing" className="flex flex-col gap-5">
      <div className="flex flex-col items-start gap-2">
        <h2 id="publishing" className="text-lg">
          Publishing
        </h2>
        <EntryStateTag state={state} />
        <p className="text-sm text-ink-soft">{stateWords(draft)}</p>
      </div>
      {publishing.error ? (
        <Notice kind="error" title="Not done" role="alert">
          {publishing.error}
        </Notice>
      ) : null}
      {lacking.length > 0 ? <Lacking lines={lacking} /> : null}
      <div className="flex flex-col gap-2">
        {publishing.canPublish ? (
          <Button tone="primary" busy={publishing.busy} busyLabel="Publishing…" onClick={publishing.publish}>
            {publishing.publishLabel}
          </Button>
        ) : null}
        {state === "public" ? null : (
          <Button onClick={() => setDialog("schedule")}>
            {state === "scheduled" ? "Change the time" : "Publish later"}
          </Button>
        )}
        {state === "scheduled" ? (
          <Button onClick={() => publishing.act({ act: "schedule", at: null })}>
            Take it off the schedule
          </Button>
        ) : null}
        {state === "public" ? (
          <LinkButton to={paths.entry(draft.build.slug, draft.slug)}>See it as readers do</LinkButton>
        ) : null}
        <LinkButton to={paths.entryHistory(draft.id)}>History</LinkButton>
        {state === "public" ? <Button onClick={() => setDialog("withdraw")}>Withdraw</Button> : null}
        {publishedAt === null ? (
          <Button tone="quiet" className="text-signal!" onClick={() => setDialog("delete")}>
            Delete this draft
          </Button>
        ) : null}
      </div>
      <Disclosure summary="Address" open={false}>
        <AddressForm draft={draft} publishing={publishing} />
      </Disclosure>
      {dialog === "schedule" ? (
        <ScheduleDialog
          scheduledAt={scheduledAt}
          error={publishing.fields.at}
          busy={publishing.busy}
          onSchedule={async (at) => (await publishing.act({ act: "schedule", at })) && close()}
          onClose={close}
        />
      ) : null}
      {dialog === "withdraw" ? (
        <ConfirmDialog
          title="Withdraw this entry?"
          action="Withdraw the entry"
          onConfirm={() => publishing.act({ act: "withdraw" })}
          onClose={close}
        >
          Readers no longer see it, and links to it lead to an empty page. It stays here, with its number and
          its history, and you can publish it again.
        </ConfirmDialog>
      ) : null}
      {dialog === "delete" ? (
        <ConfirmDialog
          title="Delete this draft?"
          action="Delete the draft"
          onConfirm={onDelete}
          onClose={close}
        >
          The draft and its history go. Photos you put into it stay with the build.
        </ConfirmDialog>
      ) : null}
    </section>
  );
}

function Lacking({ lines }: { lines: string[] }) {
  return (
    <div className="border-l-[3px] border-straw-fill pl-4 text-sm">
      <h3 className="text-sm">Before you publish</h3>
      <ul className="mt-1 flex flex-col gap-1.5">
        {lines.map((line) => (
          <li key={line} className="flex gap-2">
            <Mark shape="chisel" className="mt-1 size-3.5 text-straw" />
            <span>{line}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}

function stateWords({ state, scheduledAt, publishedAt, hasUnpublishedChanges }: EntryDraft): string {
  const now = Date.now();
  switch (state) {
    case "draft":
      return "Only you see it.";
    case "scheduled":
      return scheduledAt === null ? "" : `Published by itself on ${momentInWords(scheduledAt, now)}.`;
    case "withdrawn":
      return "Readers do not see it. They did once.";
    case "public":
      return [
        publishedAt === null ? "" : `Public since ${momentInWords(publishedAt, now)}.`,
        hasUnpublishedChanges ? "Readers do not see your latest changes yet." : "",
      ].join(" ");
  }
}
