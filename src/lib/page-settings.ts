import { createContext, useContext } from "react";
import type { PageSettings } from "#shared/contracts/rendering.ts";

const PageSettingsContext = createContext<PageSettings>({
  siteUrl: "",
  scheme: "system",
  units: "mm",
  fakes: false,
});

export const PageSettingsProvider = PageSettingsContext.Provider;

export function usePageSettings(): PageSettings {
  return useContext(PageSettingsContext);
}
