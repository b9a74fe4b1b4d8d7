import { redirect } from "react-router";
import { SignUp } from "#src/features/accounts/components/sign-up.tsx";
import { paths } from "#src/lib/paths.ts";
import { meQuery } from "#src/lib/viewer.ts";
import type { LoadContext } from "../page.tsx";

export async function load({ api, queryClient }: LoadContext) {
  if (await queryClient.ensureQueryData(meQuery(api))) throw redirect(paths.account());
}

export function Component() {
  return <SignUp />;
}
