import { useSyncExternalStore } from "react";
import type { BuildPage } from "#shared/contracts/builds.ts";
import { LinkButton } from "#src/components/link-button.tsx";
import { paths } from "#src/lib/paths.ts";
import { placeKept } from "#src/lib/reading-place.ts";

const never = () => () => {};

/** Begins with the first entry, or goes on where this browser stopped reading. */
export function StartReading({ build }: { build: BuildPage }) {
  const kept = useSyncExternalStore(
    never,
    () => placeKept(build.id),
    () => null,
  );
  const first = build.entries[0];
  const last = build.entries.at(-1);
  if (!first || !last) return null;
  const place = build.entries.find((entry) => entry.id === kept);
  const going = place && place.id !== first.id;
  return (
    <>
      <LinkButton tone="primary" to={paths.entry(build.slug, (going ? place : first).slug)}>
        {going ? `Go on at entry ${place.number}` : "Read from the start"}
      </LinkButton>
      {last.id === first.id ? null : (
        <LinkButton to={paths.entry(build.slug, last.slug)}>Read the latest entry</LinkButton>
      )}
    </>
  );
}
