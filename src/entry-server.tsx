import { dehydrate } from "@tanstack/react-query";
import { StrictMode } from "react";
import { renderToString } from "react-dom/server";
import {
  createStaticHandler,
  createStaticRouter,
  isRouteErrorResponse,
  type StaticHandlerContext,
  StaticRouterProvider,
} from "react-router";
import type { PageSettings, RenderedPage, Transport } from "#shared/contracts/rendering.ts";
import type { PageHandle } from "./app/page.tsx";
import type { PageState } from "./app/page-state.ts";
import { Providers } from "./app/providers.tsx";
import { routes } from "./app/routes.tsx";
import { createApi } from "./lib/api.ts";
import { loadIslands } from "./lib/island.tsx";
import { createQueryClient } from "./lib/query-client.ts";

/** Loads what the address needs and draws it. */
export async function render(
  request: Request,
  transport: Transport,
  settings: PageSettings,
): Promise<RenderedPage> {
  const api = createApi(transport);
  const queryClient = createQueryClient();
  const handler = createStaticHandler(routes({ api, queryClient }));
  const context = await handler.query(request);
  if (context instanceof Response) {
    return { kind: "redirect", status: context.status, location: context.headers.get("Location") ?? "/" };
  }
  await loadIslands();
  const router = createStaticRouter(handler.dataRoutes, context);
  const html = renderToString(
    <StrictMode>
      <Providers api={api} queryClient={queryClient} settings={settings}>
        <StaticRouterProvider router={router} context={context} hydrate={false} />
      </Providers>
    </StrictMode>,
  );
  const { head, body } = splitHead(html);
  const state: PageState = {
    settings,
    queries: dehydrate(queryClient),
    loaderData: context.loaderData,
    errors: plainErrors(context.errors),
  };
  queryClient.clear();
  return { kind: "page", status: context.statusCode, head, body, state, modules: matchedModules(context) };
}

/** React writes a page's title, meta and link elements first inside the root: they belong into the head. */
function splitHead(html: string): { head: string; body: string } {
  const leading = /^(?:<title>[^<]*<\/title>|<meta [^>]*\/?>|<link [^>]*\/?>)*/.exec(html)?.[0] ?? "";
  return { head: leading, body: html.slice(leading.length) };
}

function plainErrors(errors: StaticHandlerContext["errors"]): PageState["errors"] {
  if (!errors) return null;
  const entries = Object.entries(errors).map(([id, error]) => [id, plainError(error)]);
  return Object.fromEntries(entries);
}

function plainError(error: unknown): { status: number; data: unknown } {
  if (isRouteErrorResponse(error)) return { status: error.status, data: error.data };
  throw error;
}

function matchedModules(context: StaticHandlerContext): string[] {
  const handles = context.matches.map((match) => match.route.handle as PageHandle | undefined);
  return handles.flatMap((handle) => (handle ? [handle.module] : []));
}
