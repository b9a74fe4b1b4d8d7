import { existsSync, readFileSync } from "node:fs";
import { pathToFileURL } from "node:url";
import type { ViteDevServer } from "vite";
import type { PageRenderer } from "#shared/contracts/rendering.ts";

/** The client as the page renderer needs it: compiled beforehand, or by Vite as it is asked for. */
export interface ClientBuild {
  /** index.html for an address, with its placeholders. */
  template(url: string): Promise<string>;
  renderer(): Promise<PageRenderer>;
  /** Addresses of the scripts that these source modules were built into, for preloading. */
  scriptsOf(modules: string[]): string[];
}

interface ManifestChunk {
  file: string;
  imports?: string[];
}

/** The client built by `npm run build`. */
export async function builtClient(folder = "dist"): Promise<ClientBuild> {
  const entry = `${folder}/server/entry-server.js`;
  if (!existsSync(entry)) throw new Error("The client is not built. Run: npm run build");
  const html = readFileSync(`${folder}/client/index.html`, "utf8");
  const manifest = JSON.parse(readFileSync(`${folder}/client/.vite/manifest.json`, "utf8")) as Record<
    string,
    ManifestChunk
  >;
  const module = (await import(pathToFileURL(entry).href)) as PageRenderer;
  return {
    template: async () => html,
    renderer: async () => module,
    scriptsOf: (modules) => scriptsOf(manifest, modules),
  };
}

/** Every file that these modules load at once, without those that the page's own entry loads anyway. */
function scriptsOf(manifest: Record<string, ManifestChunk>, modules: string[]): string[] {
  const files = new Set<string>();
  const visit = (key: string) => {
    const chunk = manifest[key];
    if (!chunk || key === "index.html" || files.has(chunk.file)) return;
    files.add(chunk.file);
    chunk.imports?.forEach(visit);
  };
  modules.forEach(visit);
  return [...files].map((file) => `/${file}`);
}

/** The client as Vite compiles it on demand, with hot reload. */
export function developmentClient(vite: ViteDevServer): ClientBuild {
  return {
    template: async (url) => vite.transformIndexHtml(url, readFileSync("index.html", "utf8")),
    renderer: async () => (await vite.ssrLoadModule("/src/entry-server.tsx")) as PageRenderer,
    scriptsOf: () => [],
  };
}
