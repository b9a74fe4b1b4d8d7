import type { DehydratedState } from "@tanstack/react-query";
import type { HydrationState } from "react-router";
import type { PageSettings } from "#shared/contracts/rendering.ts";

/** What the server hands to the browser in the page, so that nothing is fetched twice. */
export interface PageState {
  settings: PageSettings;
  queries: DehydratedState;
  loaderData: HydrationState["loaderData"];
  /** Route errors by route id, in a form that survives JSON. */
  errors: Record<string, { status: number; data: unknown }> | null;
}
