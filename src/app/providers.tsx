import { type QueryClient, QueryClientProvider } from "@tanstack/react-query";
import type { ReactNode } from "react";
import type { PageSettings } from "#shared/contracts/rendering.ts";
import { type Api, ApiProvider } from "#src/lib/api.ts";
import { PageSettingsProvider } from "#src/lib/page-settings.ts";

interface ProvidersProps {
  api: Api;
  queryClient: QueryClient;
  settings: PageSettings;
  children: ReactNode;
}

export function Providers({ api, queryClient, settings, children }: ProvidersProps) {
  return (
    <PageSettingsProvider value={settings}>
      <ApiProvider value={api}>
        <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>
      </ApiProvider>
    </PageSettingsProvider>
  );
}
