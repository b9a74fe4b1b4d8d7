import { type LoaderFunctionArgs, redirect, useSearchParams } from "react-router";
import { SignIn } from "#src/features/accounts/components/sign-in.tsx";
import { nextPath } from "#src/features/accounts/next-path.ts";
import { demoSignInsQuery } from "#src/features/accounts/queries.ts";
import { paths } from "#src/lib/paths.ts";
import { meQuery } from "#src/lib/viewer.ts";
import type { LoadContext } from "../page.tsx";

const nextOf = (search: URLSearchParams) => nextPath(search.get("next"), paths.home());

export async function load({ api, queryClient }: LoadContext, { request }: LoaderFunctionArgs) {
  const [me] = await Promise.all([
    queryClient.ensureQueryData(meQuery(api)),
    queryClient.ensureQueryData(demoSignInsQuery(api)),
  ]);
  if (me) throw redirect(nextOf(new URL(request.url).searchParams));
}

export function Component() {
  const [search] = useSearchParams();
  // A fresh page, so that nothing fetched as a stranger stays.
  return <SignIn onSignedIn={() => window.location.assign(nextOf(search))} />;
}
