import type { KnipConfig } from "knip";

const config: KnipConfig = {
  entry: [
    "src/entry-server.tsx",
    "src/app/pages/*-page.tsx",
    "server/index.ts",
    "scripts/*.{ts,mjs}",
    "scripts/bench/bare-express.ts",
  ],
  project: ["{src,server,shared,scripts,tests}/**/*.{ts,tsx,mjs}"],
  ignoreExportsUsedInFile: true,
  // Debian's, put in place by scripts/test.mjs.
  ignoreBinaries: ["apt-get", "pdftoppm", "pdffonts", "pdftotext"],
  ignoreDependencies: [
    // Imported from style sheets, which knip does not read.
    "tailwindcss",
    "@tailwindcss/typography",
    "@fontsource-variable/.+",
    // Read as files by the PDF writer.
    "@fontsource/.+",
    "dejavu-fonts-ttf",
    // Pinned so that @tiptap/react does not bring newer ones that clash.
    "@tiptap/extension-bubble-menu",
    "@tiptap/extension-floating-menu",
    // Stands in the design card; payments come later.
    "stripe",
  ],
};

export default config;
