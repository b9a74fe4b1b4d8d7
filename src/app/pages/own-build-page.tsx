import { type LoaderFunctionArgs, redirect, useNavigate, useParams } from "react-router";
import { OwnBuildView } from "#src/features/builds/components/own-build-view.tsx";
import { ownBuildQuery } from "#src/features/builds/queries.ts";
import { paths } from "#src/lib/paths.ts";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

export async function load(context: LoadContext, { params: { build = "" }, request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
  const { slug } = await context.queryClient.ensureQueryData(ownBuildQuery(context.api, build));
  if (slug !== build) throw redirect(paths.ownBuild(slug));
}

export function Component() {
  const { build = "" } = useParams();
  const navigate = useNavigate();
  return (
    <OwnBuildView
      slug={build}
      onMoved={(slug) => void navigate(paths.ownBuild(slug), { replace: true, preventScrollReset: true })}
      onBegun={(entryId) => void navigate(paths.entryEditor(entryId))}
    />
  );
}
