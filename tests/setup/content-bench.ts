import { mkdtempSync, rmSync } from "node:fs";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import express from "express";
import { type Logger, pino } from "pino";
import { v7 as uuid } from "uuid";
import { onTestFinished } from "vitest";
import { type Database, openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { users } from "#server/db/schema/accounts.ts";
import { createBuildReader } from "#server/features/builds/reader.ts";
import { buildRoutes } from "#server/features/builds/routes.ts";
import { createBuildService } from "#server/features/builds/service.ts";
import { createStageService } from "#server/features/builds/stages.ts";
import { entryRoutes } from "#server/features/entries/routes.ts";
import { createEntryService } from "#server/features/entries/service.ts";
import { feedRoutes } from "#server/features/feeds/routes.ts";
import { photoFiles } from "#server/features/photos/files.ts";
import { registerPhotoJobs } from "#server/features/photos/jobs.ts";
import { photoRoutes } from "#server/features/photos/routes.ts";
import { createPhotoService } from "#server/features/photos/service.ts";
import { createIncoming } from "#server/features/photos/upload.ts";
import { apiRouter } from "#server/http/endpoints.ts";
import { handleErrors } from "#server/http/errors.ts";
import type { Person, Viewer } from "#server/http/viewer.ts";
import { createQueue } from "#server/jobs/queue.ts";
import { createLocalStorage } from "#server/storage/local-storage.ts";

export interface Answer {
  status: number;
  headers: Headers;
  // Tests look into answers of every shape; what they find there is what they assert.
  // biome-ignore lint/suspicious/noExplicitAny: a test reads fields and compares them
  body: any;
}

export type ContentBench = Awaited<ReturnType<typeof contentBench>>;

/**
 * Builds, entries, photos and feeds over real HTTP on a fresh database, without accounts: a header says
 * who asks. Stops by itself when the test is over.
 */
export async function contentBench() {
  const folder = mkdtempSync(join(tmpdir(), "soapstone-"));
  const time = { now: Date.UTC(2026, 4, 4, 9) };
  const clock = () => time.now;
  const log: Logger = pino({ level: "silent" });
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  const people = new Map<string, Person>();

  const started = startServices({ database, clock, log, folder });
  const app = express();
  app.use((req, _res, next) => {
    req.viewer = people.get(req.get("x-person") ?? "") ?? null;
    next();
  });
  app.use(apiRouter(started.routes), started.files, started.feeds, handleErrors(log));
  const server = app.listen(0);
  const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  onTestFinished(() => {
    server.close();
    server.closeAllConnections();
    database.$client.close();
    rmSync(folder, { recursive: true });
  });

  function person(handle: string, change: Partial<Person> = {}): Person {
    const made: Person = {
      id: uuid(),
      handle,
      name: handle[0]?.toUpperCase() + handle.slice(1),
      email: `${handle}@soapstone.example`,
      emailVerified: true,
      role: "reader",
      units: "mm",
      ...change,
    };
    const at = new Date(time.now);
    database
      .insert(users)
      .values({ ...made, createdAt: at, updatedAt: at })
      .run();
    people.set(handle, made);
    return made;
  }

  async function fetchAs(viewer: Viewer, path: string, init: RequestInit = {}): Promise<Response> {
    const headers = new Headers(init.headers);
    if (viewer) headers.set("x-person", viewer.handle);
    return fetch(origin + path, { redirect: "manual", ...init, headers });
  }

  /** Sends JSON as someone; null is a reader who is not signed in. */
  async function send(viewer: Viewer, method: string, path: string, body?: unknown): Promise<Answer> {
    const init: RequestInit = { method };
    if (body !== undefined) {
      init.body = JSON.stringify(body);
      init.headers = { "content-type": "application/json" };
    }
    const answer = await fetchAs(viewer, path, init);
    const text = await answer.text();
    const json = answer.headers.get("content-type")?.includes("json");
    return { status: answer.status, headers: answer.headers, body: json ? JSON.parse(text) : text };
  }

  /** The jobs of a process that starts now on the same database: what a restart leaves. */
  function restartedQueue() {
    return startServices({ database, clock, log, folder }).queue;
  }

  const { queue, entries, photos, storage } = started;
  return {
    database,
    folder,
    time,
    origin,
    person,
    fetchAs,
    send,
    restartedQueue,
    queue,
    entries,
    photos,
    storage,
  };
}

function startServices(parts: { database: Database; clock: () => number; log: Logger; folder: string }) {
  const { database, clock, log, folder } = parts;
  const queue = createQueue({ database, log, clock });
  const storage = createLocalStorage(folder);
  const incoming = createIncoming(join(folder, "incoming"));
  const photos = createPhotoService({ database, queue, storage, clock });
  registerPhotoJobs({ database, queue, storage, clock, incoming });
  const reader = createBuildReader({ database, photoViews: photos.photoViews });
  const entries = createEntryService({
    database,
    clock,
    queue,
    log,
    builds: reader,
    photoViews: photos.photoViews,
  });
  const builds = createBuildService({ database, clock, reader, publicEntries: entries.reading.ofBuild });
  const stages = createStageService({ database, clock, reader });
  return {
    queue,
    photos,
    entries,
    storage,
    routes: [...buildRoutes(builds, stages), ...entryRoutes(entries), ...photoRoutes(photos, incoming)],
    files: photoFiles({ photos, storage, log }),
    feeds: feedRoutes({ source: entries.reading, siteUrl: "https://diary.soapstone.example", clock }),
  };
}
