import { useQuery } from "@tanstack/react-query";
import { type MouseEvent, type ReactNode, type RefObject, useState } from "react";
import { useNavigate } from "react-router";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import type { RichDocument } from "#shared/document/types.ts";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { Button } from "#src/components/button.tsx";
import { FieldMessage } from "#src/components/field-message.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import type { EditorHandle } from "#src/editor/editor-handle.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { draftQuery, useDeleteDraft } from "../queries.ts";
import { useDraft } from "../use-draft.ts";
import { usePublishingActs } from "../use-publishing-acts.ts";
import { ConflictDialog } from "./conflict-dialog.tsx";
import { DraftNotices } from "./draft-notices.tsx";
import { EntryFields } from "./entry-fields.tsx";
import { PublishPanel } from "./publish-panel.tsx";
import { SaveWords } from "./save-words.tsx";

interface EntryEditorProps {
  /** The draft as it was when the page was opened. */
  opened: EntryDraft;
  editor: RefObject<EditorHandle | null>;
  /** The text itself: the page puts the editor together with the blocks of the features. */
  renderText(text: { initial: RichDocument; onChange(document: RichDocument): void }): ReactNode;
  onCopied(entryId: string): void;
  onDeleted(): void;
}

/** One entry being written. */
export function EntryEditor({ opened, editor, renderText, onCopied, onDeleted }: EntryEditorProps) {
  const { data: draft = opened } = useQuery(draftQuery(useApi(), opened.id));
  const open = useDraft(draft, editor);
  const publishing = usePublishingActs(draft, open);
  const remove = useDeleteDraft(draft.id);
  const [deciding, setDeciding] = useState(true);
  const { state, content, change, autosave } = open;
  const refused = state.kind === "refused" ? state.fields : {};
  const errors = { ...publishing.fields, ...refused };
  const [initial] = useState(content.document);
  const navigate = useNavigate();
  /** The preview shows what is saved, so that comes first. */
  const preview = (event: MouseEvent) => {
    event.preventDefault();
    void autosave.flush().then(() => navigate(paths.entryPreview(draft.id)));
  };
  return (
    <div className="page-width pb-28 lg:pb-16">
      <title>{`${content.title.trim() || "Untitled entry"}: writing · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <div className="pt-4">
        <Breadcrumbs
          trail={[
            { label: "Workshop", to: paths.workshop() },
            { label: draft.build.title, to: paths.ownBuild(draft.build.slug) },
          ]}
          here={draft.number === null ? "New entry" : `Entry ${draft.number}`}
        />
      </div>
      <div className="editor-bar">
        <SaveWords state={state} onRetry={() => void autosave.flush()} />
        <div className="flex gap-2">
          <LinkButton to={paths.entryPreview(draft.id)} onClick={preview}>
            Preview
          </LinkButton>
          {publishing.canPublish ? (
            <Button tone="primary" busy={publishing.busy} onClick={publishing.publish}>
              {draft.state === "public" ? "Publish changes" : "Publish"}
            </Button>
          ) : null}
        </div>
      </div>
      <div className="editor-page">
        <div className="editor-head flex flex-col gap-5">
          <h1 className="sr-only">Write an entry</h1>
          <DraftNotices draft={draft} open={open} onDecide={() => setDeciding(true)} />
          <EntryFields draft={draft} content={content} errors={errors} change={change} />
        </div>
        <div className="editor-body">
          {errors.document ? (
            <div className="editor-indent mb-3">
              <FieldMessage id="document-error" kind="error">
                {errors.document}
              </FieldMessage>
            </div>
          ) : null}
          {renderText({ initial, onChange: (document) => change({ document }) })}
        </div>
        <aside className="editor-side" aria-label="Publishing">
          <PublishPanel
            draft={draft}
            open={open}
            publishing={publishing}
            onDelete={() => remove.mutateAsync().then(onDeleted)}
          />
        </aside>
      </div>
      {state.kind === "conflict" && deciding ? (
        <ConflictDialog entry={draft.id} open={open} onClose={() => setDeciding(false)} onCopied={onCopied} />
      ) : null}
    </div>
  );
}
