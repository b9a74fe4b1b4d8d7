import { useSuspenseQuery } from "@tanstack/react-query";
import { type LoaderFunctionArgs, useParams } from "react-router";
import { LinkButton } from "#src/components/link-button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { draftQuery } from "#src/features/entries/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { OwnDocument } from "../own-document.tsx";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

export async function load(context: LoadContext, { params: { entry = "" }, request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
  await context.queryClient.fetchQuery({ ...draftQuery(context.api, entry), staleTime: 0 });
}

/** A draft as readers would see it; only its builder can open this. */
export function Component() {
  const { entry = "" } = useParams();
  const { data: draft } = useSuspenseQuery(draftQuery(useApi(), entry));
  const stage = draft.stages.find(({ id }) => id === draft.stageId);
  return (
    <div className="page-width pt-4 pb-16">
      <title>{`${draft.title || "Untitled entry"}: preview · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <Notice
        title="Preview"
        actions={<LinkButton to={paths.entryEditor(draft.id)}>Go on writing</LinkButton>}
      >
        This is the latest saved state. Only you can open this page.
      </Notice>
      <article className="mt-8">
        <header className="mb-8">
          <p className="text-sm text-ink-soft">
            {draft.build.title}
            {stage ? `, ${stage.title}` : ""}
          </p>
          <h1 className="mt-2 text-2xl">{draft.title || "Untitled entry"}</h1>
          {draft.summary ? (
            <p className="mt-4 max-w-measure font-serif text-ink-soft">{draft.summary}</p>
          ) : null}
        </header>
        <OwnDocument {...draft} />
      </article>
    </div>
  );
}
