import { useQuery } from "@tanstack/react-query";
import { useRef, useState } from "react";
import { type LoaderFunctionArgs, useNavigate, useParams } from "react-router";
import { v4 as uuid } from "uuid";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { LoadingState } from "#src/components/loading-state.tsx";
import type { EditorHandle } from "#src/editor/editor-handle.ts";
import { RichTextEditor } from "#src/editor/rich-text-editor.tsx";
import { CalculatorDialog } from "#src/features/entries/components/calculator-dialog.tsx";
import { EntryEditor } from "#src/features/entries/components/entry-editor.tsx";
import { draftQuery } from "#src/features/entries/queries.ts";
import { photoKey } from "#src/features/photos/queries.ts";
import { usePhotoUploads } from "#src/features/photos/use-photo-uploads.tsx";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { editorNodeViews } from "../editor-node-views.tsx";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

export async function load(context: LoadContext, { params: { entry = "" }, request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
  const { api, queryClient } = context;
  const draft = await queryClient.fetchQuery({ ...draftQuery(api, entry), staleTime: 0 });
  for (const photo of Object.values(draft.photos)) queryClient.setQueryData(photoKey(photo.id), photo);
}

/** The editor's page. It works in the browser alone; the server sends its place. */
export function Component() {
  const { entry = "" } = useParams();
  const hydrated = useHydrated();
  const { data: draft } = useQuery(draftQuery(useApi(), entry));
  if (!hydrated || !draft) {
    return (
      <div className="page-width py-10">
        <title>Writing · Soapstone</title>
        <meta name="robots" content="noindex" />
        <noscript>
          <p className="mb-6">Writing needs JavaScript. Reading does not.</p>
        </noscript>
        <LoadingState label="The entry is being opened." lines={8} />
      </div>
    );
  }
  return <Editing key={draft.id} opened={draft} />;
}

function Editing({ opened }: { opened: EntryDraft }) {
  const editor = useRef<EditorHandle>(null);
  const navigate = useNavigate();
  const uploads = usePhotoUploads(opened.build.id, editor);
  const [choosing, setChoosing] = useState(false);
  return (
    <>
      <EntryEditor
        opened={opened}
        editor={editor}
        onCopied={(id) => void navigate(paths.entryEditor(id))}
        onDeleted={() => void navigate(paths.ownBuild(opened.build.slug))}
        renderText={({ initial, onChange }) => (
          <RichTextEditor
            ref={editor}
            label="Text of the entry"
            initial={initial}
            onChange={onChange}
            views={editorNodeViews}
            inserts={{ photos: uploads.choose, working: () => setChoosing(true) }}
            onFiles={uploads.bring}
            renderPlace={uploads.renderPlace}
            nonce={nonce()}
          />
        )}
      />
      {uploads.inputs}
      {choosing ? (
        <CalculatorDialog
          onClose={() => setChoosing(false)}
          onChoose={(choice) => {
            setChoosing(false);
            editor.current?.insertBlock({ type: "working", attrs: { workingId: uuid(), ...choice } });
          }}
        />
      ) : null}
    </>
  );
}

/** `lib/first.ts` keeps it where Radix looks for it too. */
function nonce(): string {
  const { __webpack_nonce__ } = globalThis as { __webpack_nonce__?: string };
  return __webpack_nonce__ ?? "";
}
