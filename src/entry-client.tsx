import "./lib/first.ts";
import { hydrate } from "@tanstack/react-query";
import { StrictMode } from "react";
import { hydrateRoot } from "react-dom/client";
import { createBrowserRouter, UNSAFE_ErrorResponseImpl as ErrorResponse, matchRoutes } from "react-router";
import { RouterProvider } from "react-router-dom";
import type { PageState } from "./app/page-state.ts";
import { Providers } from "./app/providers.tsx";
import { routes } from "./app/routes.tsx";
import { createApi, fetchTransport } from "./lib/api.ts";
import { createQueryClient } from "./lib/query-client.ts";

function readState(): PageState {
  return JSON.parse(document.getElementById("page-state")?.textContent ?? "{}") as PageState;
}

function revive(errors: PageState["errors"]) {
  if (!errors) return null;
  const entries = Object.entries(errors);
  return Object.fromEntries(entries.map(([id, e]) => [id, new ErrorResponse(e.status, "", e.data)]));
}

/** Takes over the page that the server drew; the matched pages' code must be here before the first render. */
async function start(): Promise<void> {
  const state = readState();
  const api = createApi(fetchTransport);
  const queryClient = createQueryClient();
  hydrate(queryClient, state.queries);
  const table = routes({ api, queryClient });
  for (const { route } of matchRoutes(table, window.location) ?? []) {
    if (typeof route.lazy !== "function") continue;
    Object.assign(route, await route.lazy(), { lazy: undefined });
  }
  const router = createBrowserRouter(table, {
    hydrationData: { loaderData: state.loaderData, errors: revive(state.errors) },
  });
  const root = document.getElementById("root");
  if (!root) throw new Error("The page has no root element");
  hydrateRoot(
    root,
    <StrictMode>
      <Providers api={api} queryClient={queryClient} settings={state.settings}>
        <RouterProvider router={router} />
      </Providers>
    </StrictMode>,
  );
}

void start();
