import type { LoaderFunctionArgs } from "react-router";
import { Account } from "#src/features/accounts/components/account.tsx";
import type { LoadContext } from "../page.tsx";
import { requireViewer } from "../require-viewer.ts";

/** The list of sessions is fetched by the browser: the page drawn on the server does not know which session it is for. */
export async function load(context: LoadContext, { request }: LoaderFunctionArgs) {
  await requireViewer(context, request);
}

export function Component() {
  return <Account />;
}
