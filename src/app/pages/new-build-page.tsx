import { type LoaderFunctionArgs, useNavigate } from "react-router";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { NewBuildForm } from "#src/features/builds/components/new-build-form.tsx";
import { paths } from "#src/lib/paths.ts";
import { useViewer } from "#src/lib/viewer.ts";
import { ConfirmAddress } from "../confirm-address.tsx";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

export async function load(context: LoadContext, { request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
}

export function Component() {
  const navigate = useNavigate();
  const viewer = useViewer();
  return (
    <div className="page-width py-10">
      <title>Start a build · Soapstone</title>
      <meta name="robots" content="noindex" />
      <PageHeading
        title="Start a build"
        above={<Breadcrumbs trail={[{ label: "Workshop", to: paths.workshop() }]} here="Start a build" />}
        purpose="One machine being made. Readers see it when you publish its first entry, not before."
      />
      {viewer?.emailVerified ? (
        <NewBuildForm onCreated={(slug) => void navigate(paths.ownBuild(slug))} />
      ) : (
        <ConfirmAddress before="start a build" />
      )}
    </div>
  );
}
