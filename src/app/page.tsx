import type { QueryClient } from "@tanstack/react-query";
import type { ComponentType } from "react";
import { data, type LoaderFunctionArgs, type RouteObject } from "react-router";
import { type Api, ApiError } from "#src/lib/api.ts";

/** What every page's `load` works with. */
export interface LoadContext {
  api: Api;
  queryClient: QueryClient;
}

/** What a file in `pages/` exports. `load` puts the page's data into the query cache; it may throw a redirect. */
export interface PageModule {
  load?: (context: LoadContext, args: LoaderFunctionArgs) => Promise<unknown>;
  Component: ComponentType;
}

/** Tells the server which file of the build a matched route needs. */
export interface PageHandle {
  module: string;
}

const modules = import.meta.glob<PageModule>("./pages/*-page.tsx");

/** A route whose page is a chunk of its own: `pages/<name>-page.tsx`. */
export function page(context: LoadContext, path: string, name: string): RouteObject {
  const file = `./pages/${name}-page.tsx`;
  const importModule = modules[file];
  if (!importModule) throw new Error(`There is no page in ${file}`);
  return {
    path,
    handle: { module: `src/app/pages/${name}-page.tsx` } satisfies PageHandle,
    lazy: async () => {
      const { load, Component } = await importModule();
      return { Component, loader: (args) => runLoad(context, args, load) };
    },
  };
}

/** Runs a page's `load`; a refusal becomes the error page with its status. */
async function runLoad(context: LoadContext, args: LoaderFunctionArgs, load: PageModule["load"]) {
  try {
    await load?.(context, args);
    return null;
  } catch (thrown) {
    if (thrown instanceof ApiError) throw data({ message: thrown.message }, { status: thrown.status || 503 });
    throw thrown;
  }
}
