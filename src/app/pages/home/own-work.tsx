import { useQuery } from "@tanstack/react-query";
import { LinkButton } from "#src/components/link-button.tsx";
import { OwnBuildsStrip } from "#src/features/builds/components/own-builds-strip.tsx";
import { ownBuildsQuery } from "#src/features/builds/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";

/** First for a signed-in person: their own builds and what waits in each. */
export function OwnWork() {
  const { data } = useQuery(ownBuildsQuery(useApi()));
  return (
    <section aria-labelledby="own-work">
      <div className="mb-5 flex flex-wrap items-end justify-between gap-4">
        <h1 id="own-work">Your builds</h1>
        <LinkButton tone="primary" to={paths.workshop()}>
          Go to your workshop
        </LinkButton>
      </div>
      {data ? <OwnBuildsStrip builds={data.builds} /> : null}
    </section>
  );
}
