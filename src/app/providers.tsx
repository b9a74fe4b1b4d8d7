import { type QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { type ReactNode, useMemo, useState } from "react";
import type { PageSettings } from "#shared/contracts/rendering.ts";
import { type Api, ApiProvider } from "#src/lib/api.ts";
import { PageSettingsProvider } from "#src/lib/page-settings.ts";

interface ProvidersProps {
  api: Api;
  queryClient: QueryClient;
  settings: PageSettings;
  children: ReactNode;
}

export function Providers({ api, queryClient, settings: given, children }: ProvidersProps) {
  const [settings, setSettings] = useState(given);
  const changeable = useMemo(
    () => ({
      settings,
      change: (part: Partial<PageSettings>) => setSettings((before) => ({ ...before, ...part })),
    }),
    [settings],
  );
  return (
    <PageSettingsProvider value={changeable}>
      <ApiProvider value={api}>
        <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>
      </ApiProvider>
    </PageSettingsProvider>
  );
}
