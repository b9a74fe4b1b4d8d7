import { data, Link, type LoaderFunctionArgs, useParams } from "react-router";
import { findCalculator } from "#shared/calculators/registry.ts";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { CalculatorNotes } from "#src/features/workings/components/calculator-notes.tsx";
import { useUnits } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { BenchWorking } from "../bench-working.tsx";
import type { LoadContext } from "../page.tsx";
import { PageHead } from "../page-head.tsx";

export async function load(_context: LoadContext, { params }: LoaderFunctionArgs) {
  if (findCalculator(String(params.calculator))) return;
  throw data({ message: "There is no such calculator on the bench." }, { status: 404 });
}

/** One calculator at its own address, explained. */
export function Component() {
  const definition = findCalculator(String(useParams().calculator));
  const units = useUnits();
  if (!definition) return null;
  return (
    <div className="page-width pt-4">
      <PageHead
        title={definition.name}
        description={definition.purpose}
        path={paths.calculator(definition.id)}
      />
      <PageHeading
        above={<Breadcrumbs trail={[{ label: "Bench", to: paths.bench() }]} here={definition.name} />}
        title={definition.name}
        purpose={definition.purpose}
      />
      <BenchWorking key={definition.id} definition={definition} />
      <p className="mt-3 font-sans text-xs text-ink-soft">
        The address carries the numbers: copy it to hand on the sum.{" "}
        <Link to={paths.calculator(definition.id)}>Start from the example</Link>
      </p>
      <CalculatorNotes definition={definition} units={units} />
    </div>
  );
}
