// What start and test both need before they can begin. Plain JavaScript: nothing is installed yet.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";

const watched = {
  install: ["package.json", "package-lock.json"],
  build: ["src", "shared", "index.html", "vite.config.ts", "package-lock.json"],
};

/** Stops with one plain line on a Node that cannot run this. */
export function requireNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  process.stderr.write(`Soapstone needs Node 20.19 or newer; this is ${process.versions.node}.\n`);
  process.exit(1);
}

/** Runs `npm ci` when node_modules is missing or the lock file has changed since. */
export function installIfNeeded() {
  if (existsSync("node_modules/.package-lock.json") && !isStale("install")) return;
  process.stdout.write("Installing packages (a few minutes the first time)…\n");
  const { status } = spawnSync("npm", ["ci", "--no-fund", "--no-audit"], { stdio: "inherit" });
  if (status !== 0) process.exit(status ?? 1);
  mark("install");
}

/** Whether what the step reads has changed since `mark` was last called for it. */
export function isStale(step) {
  if (step === "build" && !existsSync("dist/client/index.html")) return true;
  const file = markFile(step);
  return !existsSync(file) || readFileSync(file, "utf8") !== fingerprint(step);
}

export function mark(step) {
  mkdirSync(".cache", { recursive: true });
  writeFileSync(markFile(step), fingerprint(step));
}

function markFile(step) {
  return join(".cache", `${step}.sha256`);
}

function fingerprint(step) {
  const hash = createHash("sha256");
  for (const file of watched[step].flatMap(filesBelow)) hash.update(file).update(readFileSync(file));
  return hash.digest("hex");
}

function filesBelow(path) {
  if (!statSync(path).isDirectory()) return [path];
  const names = readdirSync(path, { recursive: true }).sort();
  return names.map((name) => join(path, name)).filter((file) => statSync(file).isFile());
}
