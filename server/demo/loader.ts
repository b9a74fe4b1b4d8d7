import { copyFile, mkdtemp, rm, stat } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { hashPassword } from "better-auth/crypto";
import type { Logger } from "pino";
import { v7 as uuid } from "uuid";
import type { Database } from "#server/db/client.ts";
import type { Person } from "#server/http/viewer.ts";
import { slugFromTitle } from "#server/naming/slugs.ts";
import type { Storage } from "#server/storage/storage.ts";
import { demoBuilds } from "./builds.ts";
import { demoPeople } from "./people.ts";
import { type PhotoName, photoAlts, photoFile } from "./photos.ts";
import { photosOf, placePhotos } from "./place-photos.ts";
import { emptyEveryTable, insertPerson, listEmails, setPortrait } from "./repository.ts";
import { createDemoServices, type DemoServices } from "./services.ts";
import type { DemoBuild, DemoEntry, DemoPerson } from "./types.ts";

const dayMs = 24 * 3600_000;

export interface DemoParts {
  database: Database;
  storage: Storage;
  log: Logger;
  /** The time of loading, from which the scheduled entry counts. */
  now: number;
}

interface Loading {
  database: Database;
  services: DemoServices;
  /** Sets the clock of the services to a moment of the story, or to the time of loading. */
  at: (moment: string | number) => void;
  now: number;
  folder: string;
}

/** The administrator comes last of all, so that a load that was cut short can be told from a whole one. */
const last = demoPeople.find((person) => person.role === "administrator");

/** What is in the database as far as the demo goes. `other`: people of its own, whom nothing here may touch. */
export function demoState(database: Database): "empty" | "loaded" | "partial" | "other" {
  const present = listEmails(database);
  if (present.length === 0) return "empty";
  const ours = new Set(demoPeople.map(({ email }) => email));
  if (last && present.includes(last.email)) return "loaded";
  return present.every((email) => ours.has(email)) ? "partial" : "other";
}

/** True when the database holds people who are not of the demo. */
export function holdsOtherPeople(database: Database): boolean {
  const ours = new Set(demoPeople.map(({ email }) => email));
  return listEmails(database).some((email) => !ours.has(email));
}

/**
 * Loads the demo into an empty database, once. A load that was cut short is cleared and done again.
 *
 * @returns whether it loaded anything
 */
export async function loadDemo(parts: DemoParts): Promise<boolean> {
  const state = demoState(parts.database);
  if (state === "partial") await clear(parts);
  else if (state !== "empty") return false;
  const folder = await mkdtemp(join(tmpdir(), "soapstone-demo-"));
  let moment = parts.now;
  try {
    const services = createDemoServices({ ...parts, clock: () => moment, folder });
    const at = (time: string | number) => {
      moment = typeof time === "number" ? time : Date.parse(time);
    };
    await loadAll({ database: parts.database, services, at, now: parts.now, folder });
    return true;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Empties the whole database and its photos, then loads the demo afresh. */
export async function resetDemo(parts: DemoParts): Promise<void> {
  await clear(parts);
  await loadDemo(parts);
}

async function clear({ database, storage }: DemoParts): Promise<void> {
  emptyEveryTable(database);
  await storage.removeFolder("photos");
}

async function loadAll(loading: Loading): Promise<void> {
  const everyone = new Map<string, Person>();
  for (const person of demoPeople) {
    if (person !== last) everyone.set(person.key, await loadPerson(loading, person));
  }
  for (const build of demoBuilds) {
    const owner = everyone.get(build.owner);
    if (!owner) throw new Error(`The demo's ${build.title} belongs to nobody`);
    await loadBuild(loading, build, owner);
  }
  if (last) await loadPerson(loading, last);
}

async function loadPerson(loading: Loading, demo: DemoPerson): Promise<Person> {
  const { database } = loading;
  const { name, email, role, units } = demo;
  const person = { id: uuid(), handle: slugFromTitle(name, "person"), name, email, role, units };
  insertPerson(database, demo, { ...person, passwordHash: await hashPassword(demo.password) });
  const viewer = { ...person, emailVerified: true };
  loading.at(demo.since);
  if (demo.avatar) {
    const portrait = await upload(loading, viewer, demo.avatar, { purpose: "avatar" });
    setPortrait(database, person.id, portrait);
  }
  return viewer;
}

/** Uploads a copy, since an upload uses its file up. */
async function upload(
  { services, folder }: Loading,
  owner: Person,
  name: PhotoName,
  fields: { purpose: string; build?: string },
): Promise<string> {
  const path = join(folder, `${name}.jpg`);
  await copyFile(photoFile(name), path);
  const { size } = await stat(path);
  return (await services.photos.upload(owner, { path, size }, fields)).id;
}

async function loadBuild(loading: Loading, demo: DemoBuild, owner: Person): Promise<void> {
  const { services, at } = loading;
  at(demo.startedAt);
  const { id, slug } = services.builds.create(owner, demo);
  const stages = new Map<string, string>();
  for (const stage of demo.stages) stages.set(stage.title, services.stages.create(owner, slug, stage).id);
  const photos = new Map<PhotoName, string>();
  for (const name of new Set([demo.cover, ...demo.entries.flatMap((entry) => photosOf(entry.content))])) {
    photos.set(name, await upload(loading, owner, name, { purpose: "entry", build: id }));
  }
  const photoId = (name: PhotoName) => found(photos.get(name), name);
  services.builds.update(owner, slug, {
    coverPhotoId: photoId(demo.cover),
    coverAlt: photoAlts[demo.cover],
  });
  for (const entry of demo.entries) {
    const stageId = found(stages.get(entry.stage), entry.stage);
    loadEntry(loading, entry, { owner, slug, stageId, photoId });
  }
}

function loadEntry(
  { services, at, now }: Loading,
  entry: DemoEntry,
  place: { owner: Person; slug: string; stageId: string; photoId: (name: PhotoName) => string },
): void {
  const { owner, slug, stageId, photoId } = place;
  const { drafts, publishing } = services.entries;
  const { title, summary, state } = entry;
  at(entry.at);
  const begun = drafts.create(owner, slug, { stageId, title });
  const { id, version } = drafts.save(owner, begun.id, {
    baseVersion: begun.version,
    title,
    summary,
    stageId,
    document: placePhotos(entry.content, photoId),
  });
  if (state === "public") publishing.publish(owner, id, version);
  if (typeof state === "object") {
    at(now);
    publishing.schedule(owner, id, { baseVersion: version, at: now + state.scheduledInDays * dayMs });
  }
}

function found(id: string | undefined, name: string): string {
  if (id === undefined) throw new Error(`The demo has no ${name}`);
  return id;
}
