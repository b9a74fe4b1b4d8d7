import { useQuery } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router";
import { LinkButton } from "#src/components/link-button.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { OwnBuilds } from "#src/features/builds/components/own-builds.tsx";
import { ownBuildsQuery } from "#src/features/builds/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { useViewer } from "#src/lib/viewer.ts";
import { ConfirmAddress } from "../confirm-address.tsx";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

export async function load(context: LoadContext, { request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
  await context.queryClient.ensureQueryData(ownBuildsQuery(context.api));
}

export function Component() {
  const viewer = useViewer();
  const mayStart = viewer?.emailVerified === true;
  // While there is no build, the empty list itself says how to begin.
  const hasBuilds = (useQuery(ownBuildsQuery(useApi())).data?.builds.length ?? 0) > 0;
  return (
    <div className="page-width py-10">
      <title>Workshop · Soapstone</title>
      <meta name="robots" content="noindex" />
      <PageHeading
        title="Workshop"
        purpose="Your builds, what is still a draft and what goes public next."
        actions={
          mayStart && hasBuilds ? (
            <LinkButton to={paths.newBuild()} tone="primary">
              Start a build
            </LinkButton>
          ) : null
        }
      />
      <OwnBuilds notYet={mayStart ? null : <ConfirmAddress before="start a build" />} />
    </div>
  );
}
