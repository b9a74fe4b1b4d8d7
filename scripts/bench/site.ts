import { type ChildProcess, spawn } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout as wait } from "node:timers/promises";
import { demoPeople } from "#server/demo/people.ts";

/** A server of our own with the demo loaded, in a process of its own so that measuring does not slow it. */
export interface Site {
  url: string;
  stop(): Promise<void>;
}

const port = 4321;

export async function startSite(): Promise<Site> {
  const uploads = mkdtempSync(join(tmpdir(), "soapstone-bench-"));
  const url = `http://localhost:${port}`;
  const server = spawn(process.execPath, ["--import", "tsx", "server/index.ts"], {
    env: {
      ...process.env,
      NODE_ENV: "production",
      PORT: String(port),
      UPLOADS_DIR: uploads,
      LOG_LEVEL: "error",
    },
    stdio: ["ignore", "ignore", "inherit"],
  });
  await answering(`${url}/api/health`);
  return {
    url,
    async stop() {
      await ended(server);
      rmSync(uploads, { recursive: true, force: true });
    },
  };
}

async function answering(address: string): Promise<void> {
  for (let tries = 0; tries < 300; tries += 1) {
    const answer = await fetch(address).catch(() => null);
    if (answer?.ok) return;
    await wait(100);
  }
  throw new Error(`Nothing answers at ${address}`);
}

function ended(process: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    process.once("exit", () => resolve());
    process.kill("SIGTERM");
  });
}

/** Waits until the server has no photo left to work on. */
export async function photosDone(site: Site): Promise<void> {
  for (let tries = 0; tries < 3000; tries += 1) {
    const health = (await (await fetch(`${site.url}/api/health`)).json()) as { dueJobs: number };
    if (health.dueJobs === 0) return;
    await wait(200);
  }
  throw new Error("The photos were not done in ten minutes");
}

/** The session cookie of the first demo builder. */
export async function signInDemoBuilder(site: Site): Promise<string> {
  const [builder] = demoPeople;
  if (!builder) throw new Error("The demo has nobody to sign in as");
  const answer = await fetch(`${site.url}/api/auth/sign-in/email`, {
    method: "POST",
    headers: { "Content-Type": "application/json", Origin: site.url },
    body: JSON.stringify({ email: builder.email, password: builder.password }),
  });
  const cookies = answer.headers.getSetCookie().map((cookie) => cookie.split(";")[0]);
  if (!answer.ok) throw new Error(`Signing in failed with ${answer.status}`);
  return cookies.join("; ");
}

/** The address of the newest public entry. */
export async function newestEntry(site: Site): Promise<string> {
  const answer = await fetch(`${site.url}/api/entries`);
  const { items } = (await answer.json()) as { items: { slug: string; build: { slug: string } }[] };
  const [entry] = items;
  if (!entry) throw new Error("The demo has no public entry");
  return `${site.url}/builds/${entry.build.slug}/entries/${entry.slug}`;
}
