// Starts Soapstone on a fresh machine: installs what is missing, builds what has changed, then serves.
// Plain JavaScript, as it runs before anything is installed.
import { spawn, spawnSync } from "node:child_process";
import { installIfNeeded, isStale, mark, requireNode } from "./prepare.mjs";

const development = process.argv.includes("--development");

requireNode();
installIfNeeded();
if (!development && isStale("build")) {
  process.stdout.write("Building the client…\n");
  const { status } = spawnSync("npm", ["run", "--silent", "build", "--", "--logLevel", "warn"], {
    stdio: "inherit",
  });
  if (status !== 0) process.exit(status ?? 1);
  mark("build");
}

const server = spawn(process.execPath, ["--import", "tsx", "server/index.ts"], {
  stdio: "inherit",
  env: { NODE_ENV: development ? "development" : "production", ...process.env },
});
for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => server.kill(signal));
server.on("exit", (code) => process.exit(code ?? 0));
