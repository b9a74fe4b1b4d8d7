import { createContext, useContext } from "react";
import type { PageSettings } from "#shared/contracts/rendering.ts";
import { useViewer } from "./viewer.ts";

export interface ChangeablePageSettings {
  settings: PageSettings;
  change(part: Partial<PageSettings>): void;
}

const PageSettingsContext = createContext<ChangeablePageSettings>({
  settings: { siteUrl: "", scheme: "system", units: "mm", fakes: false },
  change: () => {},
});

export const PageSettingsProvider = PageSettingsContext.Provider;

export function usePageSettings(): PageSettings {
  return useContext(PageSettingsContext).settings;
}

/** Takes a chosen setting into the open page; keeping it is the cookie's part. */
export function useChangePageSettings(): ChangeablePageSettings["change"] {
  return useContext(PageSettingsContext).change;
}

/** How lengths are shown: a signed-in person's own preference, else what this browser was told. */
export function useUnits(): PageSettings["units"] {
  const chosen = usePageSettings().units;
  return useViewer()?.units ?? chosen;
}
