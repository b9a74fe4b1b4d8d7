import { rmSync } from "node:fs";

// Each run of the browser tests begins with the demo freshly loaded.
rmSync(process.env.UPLOADS_DIR ?? ".cache/e2e-uploads", { recursive: true, force: true });
await import("#server/index.ts");
