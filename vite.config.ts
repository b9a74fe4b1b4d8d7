import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { compression, defineAlgorithm } from "vite-plugin-compression2";
import { defineConfig } from "vitest/config";

/** What most pages share travels in one file: twenty small ones pack worse and load later. */
const sharedKit = { name: "shared", test: /src[/\\](?:components|lib)[/\\]/, minShareCount: 4 };

/** Packed once, as small as can be, so that serving a file costs nothing. */
const precompressed = compression({
  include: /\.(?:js|css|svg|wasm)$/,
  threshold: 1024,
  algorithms: [defineAlgorithm("brotliCompress"), defineAlgorithm("gzip", { level: 9 })],
});

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [react(), tailwindcss(), !isSsrBuild && precompressed],
  appType: "custom",
  html: { cspNonce: "__CSP_NONCE__" },
  build: {
    target: "es2022",
    outDir: isSsrBuild ? "dist/server" : "dist/client",
    manifest: !isSsrBuild,
    copyPublicDir: false,
    cssCodeSplit: false,
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 1024,
    // The names of pages and parts stand in the manifest, so that the server can preload what a page needs.
    modulePreload: { polyfill: false },
    rolldownOptions: isSsrBuild ? {} : { output: { codeSplitting: { groups: [sharedKit] } } },
  },
  ssr: { noExternal: isSsrBuild ? [/^@tiptap\/static-renderer/] : [] },
  cacheDir: ".cache/vite",
  test: {
    include: ["tests/{shared,server,src,reference}/**/*.test.{ts,tsx}"],
    setupFiles: ["tests/setup/no-console.ts"],
    pool: "forks",
    testTimeout: 20_000,
    hookTimeout: 30_000,
    server: { deps: { inline: [/@tiptap/] } },
  },
}));
