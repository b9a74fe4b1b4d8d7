import { statSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { demoBuilds } from "#server/demo/builds.ts";
import { workingId } from "#server/demo/document.ts";
import { demoPeople } from "#server/demo/people.ts";
import { photoAlts, photoFile, photoNames } from "#server/demo/photos.ts";
import { photosOf, placePhotos } from "#server/demo/place-photos.ts";
import type { QuotedFigure } from "#server/demo/types.ts";
import { slugFromTitle } from "#server/naming/slugs.ts";
import { runCalculator } from "#shared/calculators/registry.ts";
import { countWords, photosIn, plainText, workingsIn } from "#shared/document/read.ts";
import { validateDocument } from "#shared/document/validate.ts";

const somePhoto = "0198c0de-0000-7000-8000-000000000001";
const entries = demoBuilds.flatMap((build) =>
  build.entries.map((entry) => ({
    address: `/builds/${build.slug}/entries/${entry.slug}`,
    build,
    entry,
    document: placePhotos(entry.content, () => somePhoto),
  })),
);
const workings = entries.flatMap(({ document }) => workingsIn(document));

function resultOf(key: string, path: string): unknown {
  const working = workings.find((candidate) => candidate.workingId === workingId(key));
  const run = runCalculator(working?.calculator ?? "", working?.inputs);
  if (!run.ok) throw new Error(`${key}: ${run.issue.message}`);
  return path
    .split(".")
    .reduce<unknown>((value, name) => (value as Record<string, unknown>)[name], run.value.results);
}

/** The number written in the prose, with as many decimals as were written. */
function written(text: string): { value: number; decimals: number } {
  const digits = /\d+(?:\.(\d+))?/.exec(text);
  return { value: Number(digits?.[0]), decimals: digits?.[1]?.length ?? 0 };
}

const workedOut = (figure: QuotedFigure): number =>
  "sum" in figure ? figure.sum() : Number(resultOf(figure.working, figure.result));

describe("demoBuilds", () => {
  it("has seven entries of Heron, three of Pelican and two of the gantry or more", () => {
    const published = (slug: string) =>
      entries.filter(({ build, entry }) => build.slug === slug && entry.state === "public").length;
    expect(published("heron")).toBeGreaterThanOrEqual(7);
    expect(published("pelican")).toBeGreaterThanOrEqual(3);
    expect(published("shed-gantry")).toBeGreaterThanOrEqual(2);
  });

  it("keeps one draft and one scheduled entry in the workshop", () => {
    expect(entries.filter(({ entry }) => entry.state === "draft")).toHaveLength(1);
    expect(entries.filter(({ entry }) => typeof entry.state === "object")).toHaveLength(1);
  });

  it("shows at least six different settings of the saddle cope", () => {
    const settings = workings.map(({ inputs }) => JSON.stringify(inputs));
    expect(new Set(settings).size).toBeGreaterThanOrEqual(6);
    expect(workings.some(({ inputs }) => inputs.angle === 90 && inputs.headerOd === inputs.branchOd)).toBe(
      true,
    );
    expect(workings.some(({ inputs }) => inputs.angle === 55)).toBe(true);
    expect(workings.some(({ inputs }) => Number(inputs.offset ?? 0) !== 0)).toBe(true);
  });

  it("gives every working an id of its own", () => {
    expect(new Set(workings.map(({ workingId: id }) => id)).size).toBe(workings.length);
  });

  it("dates the entries of each build in order, within the year before December 2026", () => {
    for (const { entries: written } of demoBuilds) {
      const dated = written.filter(({ state }) => state === "public").map(({ at }) => Date.parse(at));
      expect(dated).toEqual([...dated].sort((a, b) => a - b));
      for (const at of dated) {
        expect(at).toBeGreaterThan(Date.parse("2025-12-01"));
        expect(at).toBeLessThan(Date.parse("2026-12-01"));
      }
    }
  });

  it("starts each build before its first entry and after its owner joined", () => {
    for (const { owner, startedAt, entries: written } of demoBuilds) {
      const since = demoPeople.find(({ key }) => key === owner)?.since ?? "";
      expect(Date.parse(since)).toBeLessThan(Date.parse(startedAt));
      for (const { at } of written) expect(Date.parse(startedAt)).toBeLessThan(Date.parse(at));
    }
  });
});

describe.each(entries)("$address", ({ build, entry, document }) => {
  it("is a valid document", () => {
    const checked = validateDocument(document);
    expect(checked.ok ? [] : checked.issue).toEqual([]);
  });

  it("is an entry of at least 300 words with a summary that fits", () => {
    expect(countWords(document)).toBeGreaterThanOrEqual(300);
    expect(countWords(document)).toBeLessThanOrEqual(900);
    expect(entry.summary.length).toBeGreaterThan(40);
    expect(entry.summary.length).toBeLessThanOrEqual(300);
  });

  it("has the address that its title gives", () => {
    expect(slugFromTitle(entry.title, "")).toBe(entry.slug);
  });

  it("stands in a stage of its build", () => {
    expect(build.stages.map(({ title }) => title)).toContain(entry.stage);
  });

  it("has only workings that compute", () => {
    for (const { calculator, inputs, title } of workingsIn(document)) {
      const run = runCalculator(calculator, inputs);
      expect(run.ok ? [] : [title, run.issue]).toEqual([]);
    }
  });

  it("quotes figures as they were worked out", () => {
    const text = plainText(document);
    for (const figure of entry.quoted) {
      expect(text).toContain(figure.text);
      const { value, decimals } = written(figure.text);
      expect([figure.text, workedOut(figure).toFixed(decimals)]).toEqual([
        figure.text,
        value.toFixed(decimals),
      ]);
    }
  });

  it("links only to entries that readers can open", () => {
    const open = entries.filter((each) => each.entry.state === "public").map(({ address }) => address);
    const links = JSON.stringify(document).match(/(?<="href":")[^"]+/g) ?? [];
    for (const link of links) expect(open).toContain(link);
  });

  it("shows photos that exist, each with its description", () => {
    for (const name of photosOf(entry.content)) {
      expect(statSync(photoFile(name)).size).toBeGreaterThan(1000);
    }
    for (const { alt } of photosIn(document)) expect(alt?.length).toBeGreaterThan(20);
  });

  it("never calls a thing safe", () => {
    expect(plainText(document)).not.toMatch(/\b(?:safe|safely|OK to use)\b/i);
  });
});

describe("photoAlts", () => {
  it("describes every picture in the folder, none over 700 kB", () => {
    for (const name of photoNames) {
      expect(statSync(photoFile(name)).size).toBeLessThan(700_000);
      expect(photoAlts[name].length).toBeLessThanOrEqual(300);
    }
  });
});

describe("demoPeople", () => {
  it("has addresses that reach nobody, and passwords of their own", () => {
    for (const { email } of demoPeople) expect(email).toMatch(/\.example$/);
    expect(new Set(demoPeople.map(({ password }) => password)).size).toBe(demoPeople.length);
  });

  it("owns every build", () => {
    const keys = demoPeople.map(({ key }) => key);
    for (const { owner } of demoBuilds) expect(keys).toContain(owner);
  });
});
