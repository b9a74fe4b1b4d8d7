import type { RouteObject } from "react-router";
import { meQuery } from "#src/lib/viewer.ts";
import { ErrorPage } from "./error-page.tsx";
import { Layout } from "./layout.tsx";
import { type LoadContext, page } from "./page.tsx";

/** The whole map of the site. */
export function routes(context: LoadContext): RouteObject[] {
  return [
    {
      id: "root",
      Component: Layout,
      loader: async () => {
        await context.queryClient.ensureQueryData(meQuery(context.api));
        return null;
      },
      shouldRevalidate: () => false,
      // The error page of a page below keeps the header; that of the root stands alone.
      errorElement: <ErrorPage />,
      children: [
        {
          errorElement: <ErrorPage />,
          children: [
            page(context, "/", "home"),
            page(context, "/builds", "builds"),
            page(context, "/builds/:build", "build"),
            page(context, "/builds/:build/entries/:entry", "entry"),
            page(context, "/bench", "bench"),
            page(context, "/bench/:calculator", "calculator"),
            page(context, "/api", "api"),
            page(context, "/people/:handle", "person"),
            page(context, "/workshop", "workshop"),
            page(context, "/workshop/builds/new", "new-build"),
            page(context, "/workshop/builds/:build", "own-build"),
            page(context, "/sign-in", "sign-in"),
            page(context, "/sign-up", "sign-up"),
            page(context, "/forgot-password", "forgot-password"),
            page(context, "/reset-password", "reset-password"),
            page(context, "/verify-email", "verify-email"),
            page(context, "/account", "account"),
            page(context, "/workshop/entries/:entry", "entry-editor"),
            page(context, "/workshop/entries/:entry/history", "entry-history"),
            page(context, "/workshop/entries/:entry/preview", "entry-preview"),
            page(context, "/dev/kit", "dev-kit"),
            page(context, "*", "not-found"),
          ],
        },
      ],
    },
  ];
}
