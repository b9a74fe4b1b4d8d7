import { useQuery } from "@tanstack/react-query";
import type { DemoSignIn } from "#shared/contracts/sessions.ts";
import { Button } from "#src/components/button.tsx";
import { useApi } from "#src/lib/api.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { demoSignInsQuery } from "../queries.ts";

/** The people of the demo, while it is loaded: nothing otherwise. */
export function DemoSignIns({ onChoose }: { onChoose: (signIn: DemoSignIn) => void }) {
  const hydrated = useHydrated();
  const { data: signIns = [] } = useQuery(demoSignInsQuery(useApi()));
  if (signIns.length === 0) return null;
  return (
    <section aria-labelledby="demo-sign-ins">
      <h2 id="demo-sign-ins" className="text-lg">
        Look round as one of the demo
      </h2>
      <p className="mt-2 max-w-measure text-ink-soft text-sm">
        These people are invented. Their passwords stand here only while the demo is loaded.
      </p>
      <ul className="mt-5 border-hairline border-t">
        {signIns.map((signIn) => (
          <li
            key={signIn.email}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-hairline border-b py-3"
          >
            <div className="min-w-0 flex-1 basis-64">
              <p className="font-semibold leading-snug">
                {signIn.name}
                <span className="font-normal text-ink-soft">, {signIn.what}</span>
              </p>
              <p className="figures mt-1 flex flex-wrap gap-x-4 break-all text-ink-soft text-xs">
                <span>{signIn.email}</span>
                <span>{signIn.password}</span>
              </p>
            </div>
            <Button disabled={!hydrated} onClick={() => onChoose(signIn)}>
              Fill in<span className="sr-only"> {signIn.name}</span>
            </Button>
          </li>
        ))}
      </ul>
    </section>
  );
}
