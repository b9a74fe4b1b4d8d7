// Does all set-up, runs every check in order, and closes with one plain line: N passed, N failed.
// Plain JavaScript, as it runs before anything is installed.
import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import { installIfNeeded, mark, requireNode } from "./prepare.mjs";

const withBrowser = !process.argv.includes("--no-browser");
const resultFolder = ".cache/test-results";

requireNode();
installIfNeeded();
const tools = findTools();
rmSync(resultFolder, { recursive: true, force: true });
mkdirSync(resultFolder, { recursive: true });

const totals = { passed: 0, failed: 0 };
step("format and lint", "npx", ["biome", "check", "."]);
step("boundaries and cycles", "npx", [
  "depcruise",
  "--config",
  ".dependency-cruiser.mjs",
  "src",
  "server",
  "shared",
  "scripts",
  "tests",
]);
step("types", "npx", ["tsc"]);
step("unused code", "npx", ["knip"]);
step("build", "npm", ["run", "--silent", "build", "--", "--logLevel", "warn"]) && mark("build");
suite(
  "unit and API tests",
  ["vitest", "run", "--reporter=default", "--reporter=json", `--outputFile.json=${resultFolder}/vitest.json`],
  () => {
    const report = readJson(`${resultFolder}/vitest.json`);
    return { passed: report.numPassedTests, failed: report.numFailedTests };
  },
);
if (withBrowser) {
  suite("browser tests", ["playwright", "test"], () => {
    const { stats } = readJson(`${resultFolder}/playwright.json`);
    return { passed: stats.expected + stats.flaky, failed: stats.unexpected };
  });
}
process.stdout.write(`\n${totals.passed} passed, ${totals.failed} failed\n`);
process.exit(totals.failed > 0 ? 1 : 0);

/** A check that counts as one test. */
function step(name, command, args) {
  process.stdout.write(`\n== ${name}\n`);
  const good = spawnSync(command, args, { stdio: "inherit" }).status === 0;
  totals[good ? "passed" : "failed"] += 1;
  return good;
}

/** A test runner; its own counts are added, and a run that dies without a report counts as one failure. */
function suite(name, args, count) {
  process.stdout.write(`\n== ${name}\n`);
  const { status } = spawnSync("npx", args, { stdio: "inherit", env: { ...process.env, ...tools } });
  try {
    const { passed, failed } = count();
    totals.passed += passed;
    totals.failed += failed === 0 && status !== 0 ? 1 : failed;
  } catch {
    totals.failed += 1;
  }
}

function readJson(file) {
  return JSON.parse(readFileSync(file, "utf8"));
}

/** Chromium and a PDF rasteriser: those of the system, else installed where that is possible. */
function findTools() {
  const wanted = { chromium: has("chromium"), "poppler-utils": has("pdftoppm") };
  const missing = Object.keys(wanted).filter((name) => !wanted[name]);
  if (missing.length > 0) installWithApt(missing);
  return { CHROMIUM: which("chromium") };
}

function installWithApt(names) {
  const advice = `The tests need ${names.join(" and ")}. On Debian: apt-get install ${names.join(" ")}\n`;
  if (process.getuid?.() !== 0 || !existsSync("/etc/debian_version")) {
    process.stderr.write(advice);
    process.exit(1);
  }
  const apt = (...args) =>
    spawnSync("apt-get", ["-o", "DPkg::Lock::Timeout=300", "-q", ...args], { stdio: "inherit" });
  apt("update");
  if (apt("install", "-y", "--no-install-recommends", ...names).status !== 0) {
    process.stderr.write(advice);
    process.exit(1);
  }
}

function which(name) {
  return spawnSync("which", [name], { encoding: "utf8" }).stdout.trim();
}

function has(name) {
  return which(name) !== "";
}
