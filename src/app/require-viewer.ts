import { redirect } from "react-router";
import type { Me } from "#shared/contracts/people.ts";
import { paths } from "#src/lib/paths.ts";
import { meQuery } from "#src/lib/viewer.ts";
import type { LoadContext } from "./page.tsx";

/** The signed-in person; anyone else is sent to sign in and comes back to this page afterwards. */
export async function requireViewer({ api, queryClient }: LoadContext, request: Request): Promise<Me> {
  const me = await queryClient.ensureQueryData(meQuery(api));
  if (me) return me;
  const { pathname, search } = new URL(request.url);
  throw redirect(paths.signIn(pathname + search));
}
