import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [react(), tailwindcss()],
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
