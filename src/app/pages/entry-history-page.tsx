import { useQuery } from "@tanstack/react-query";
import { type LoaderFunctionArgs, useNavigate, useParams, useSearchParams } from "react-router";
import { LoadingState } from "#src/components/loading-state.tsx";
import { EntryHistory } from "#src/features/entries/components/entry-history.tsx";
import { draftQuery, revisionsQuery } from "#src/features/entries/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { OwnDocument } from "../own-document.tsx";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

export async function load(context: LoadContext, { params: { entry = "" }, request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
  const { api, queryClient } = context;
  await Promise.all([
    queryClient.fetchQuery({ ...draftQuery(api, entry), staleTime: 0 }),
    queryClient.prefetchQuery(revisionsQuery(api, entry)),
  ]);
}

export function Component() {
  const { entry = "" } = useParams();
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const hydrated = useHydrated();
  const { data: draft } = useQuery(draftQuery(useApi(), entry));
  // Times are said in the person's own time zone, which only the browser knows.
  if (!draft || !hydrated) {
    return (
      <div className="page-width py-10">
        <title>History · Soapstone</title>
        <LoadingState label="The history is on its way." />
      </div>
    );
  }
  return (
    <EntryHistory
      draft={draft}
      chosen={Number(search.get("revision")) || null}
      renderDocument={(revision) => <OwnDocument {...revision} />}
      onRestored={() => void navigate(paths.entryEditor(entry))}
    />
  );
}
