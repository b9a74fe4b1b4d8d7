import type { BuildPage, EntrySummary } from "#shared/contracts/builds.ts";
import { type RulePhoto, type RuleTick, SteelRule } from "#src/components/steel-rule.tsx";
import { paths } from "#src/lib/paths.ts";
import { firstOfStages } from "../stage-entries.ts";

/** A build's time line: from its beginning to its last entry, with a little room after. */
export function BuildRule({ build }: { build: BuildPage }) {
  const major = firstOfStages(build.entries);
  const dates = build.entries.map((entry) => entry.publishedAt);
  const from = Math.min(build.createdAt, ...dates);
  const to = Math.max(build.createdAt, ...dates);
  const room = Math.max((to - from) * 0.06, 5 * 86_400_000);
  return (
    <SteelRule
      label={`Time line of ${build.title}`}
      from={from}
      to={to + room}
      ticks={build.entries.map((entry) => tickOf(build.slug, entry, major.has(entry.id)))}
      photos={build.entries.flatMap((entry) => photoOf(build.slug, entry))}
    />
  );
}

function tickOf(build: string, entry: EntrySummary, major: boolean): RuleTick {
  return {
    date: entry.publishedAt,
    number: String(entry.number),
    label: entry.title,
    href: paths.entry(build, entry.slug),
    major,
    kind: "entry",
  };
}

function photoOf(build: string, entry: EntrySummary): RulePhoto[] {
  const file = entry.photo?.webp[0];
  if (!file) return [];
  const href = paths.entry(build, entry.slug);
  return [{ date: entry.publishedAt, src: file.url, alt: entry.photoAlt || entry.title, href }];
}
