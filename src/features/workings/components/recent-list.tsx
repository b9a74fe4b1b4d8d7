import { useMemo } from "react";
import { Link } from "react-router";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { recentSums } from "../recent-sums.ts";

/** What this browser last had on the bench; nothing on the server, which cannot know. */
export function RecentList({ names }: { names: ReadonlyMap<string, string> }) {
  const live = useHydrated();
  const recent = useMemo(
    () => (live ? recentSums().filter((sum) => names.has(sum.calculator)) : []),
    [live, names],
  );
  if (recent.length === 0) return null;
  return (
    <section aria-label="Lately on this bench" className="mb-8 font-sans text-sm">
      <h2 className="mb-1 text-sm font-semibold">Lately on this bench</h2>
      <ul className="flex flex-wrap gap-x-5">
        {recent.map(({ calculator, query }) => (
          <li key={calculator}>
            <Link to={paths.calculator(calculator, query)} className="inline-flex min-h-11 items-center">
              {names.get(calculator)}
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
