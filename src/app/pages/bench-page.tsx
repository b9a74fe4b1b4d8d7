import { useSuspenseQuery } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { useSearchParams } from "react-router";
import { Button } from "#src/components/button.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { LiveRegion } from "#src/components/live-region.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { CalculatorList } from "#src/features/workings/components/calculator-list.tsx";
import { RecentList } from "#src/features/workings/components/recent-list.tsx";
import { findCalculatorsBy } from "#src/features/workings/find-calculators.ts";
import { calculatorsQuery } from "#src/features/workings/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";

export async function load({ api, queryClient }: LoadContext) {
  await queryClient.ensureQueryData(calculatorsQuery(api));
}

/** Every calculator, open to anyone. */
export function Component() {
  const { data } = useSuspenseQuery(calculatorsQuery(useApi()));
  const [search] = useSearchParams();
  const [find, setFind] = useState(search.get("find") ?? "");
  const live = useHydrated();
  const found = findCalculatorsBy(data.items, find);
  const names = useMemo(() => new Map(data.items.map(({ id, name }) => [id, name])), [data]);
  return (
    <div className="page-width pt-8">
      <PageHead
        title="The bench"
        description="Workshop sums with their drawings: copes and mitres, steering and suspension, strength, bending, threads, cutting stock. Open to anyone."
        path={paths.bench()}
      />
      <PageHeading
        title="The bench"
        purpose="Workshop sums with their drawings, cautions and method. No account needed."
      />
      <search aria-label="Calculators">
        <form
          className="mb-8 flex max-w-measure items-end gap-3 font-sans"
          onSubmit={(event) => live && event.preventDefault()}
        >
          <TextField
            frameClassName="flex-1"
            label="What are you doing?"
            help="In workshop words: notch, bump steer, drill for a thread."
            name="find"
            type="search"
            autoComplete="off"
            value={find}
            onChange={(event) => setFind(event.target.value)}
          />
          {live ? null : <Button type="submit">Find</Button>}
        </form>
      </search>
      <RecentList names={names} />
      <LiveRegion>{find ? `${found.length} found` : ""}</LiveRegion>
      {found.length > 0 ? (
        <CalculatorList calculators={found} />
      ) : (
        <EmptyState
          title={`Nothing here for “${find}”`}
          action={
            <LinkButton to={paths.bench()} onClick={() => setFind("")}>
              Show all
            </LinkButton>
          }
        >
          Try another word for it, or fewer words.
        </EmptyState>
      )}
    </div>
  );
}
