import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import { Caution } from "#src/components/caution.tsx";
import { Disclosure } from "#src/components/disclosure.tsx";

/** The formula, what it means and where it is from, for whoever wants to check it. */
export function SumMethod({ definition }: { definition: CalculatorDefinition }) {
  const { formula, explanation, sources } = definition.method;
  return (
    <Disclosure summary="How this is worked out">
      <div className="flex max-w-measure flex-col gap-3">
        <ul className="figures flex flex-col gap-1.5 text-xs">
          {formula.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
        <p>{explanation}</p>
        <p className="font-semibold">Sources</p>
        <ul className="list-disc pl-5 text-xs">
          {sources.map((source) => (
            <li key={source}>{source}</li>
          ))}
        </ul>
        <p className="text-xs text-ink-soft">
          {definition.name}, version {definition.version}.
        </p>
      </div>
    </Disclosure>
  );
}

/** What can hurt someone: always in view. */
export function SumCautions({ cautions }: { cautions: readonly string[] }) {
  return (
    <Caution compact>
      <ul className="list-disc gap-x-8 space-y-0.5 pl-4 @2xl:columns-2 *:break-inside-avoid">
        {cautions.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </Caution>
  );
}

/** What to do at the bench, with the numbers in it. */
export function SumSteps({ steps }: { steps: readonly string[] }) {
  return (
    <Disclosure summary="Mark it by hand">
      <ol className="flex max-w-measure list-decimal flex-col gap-2 pl-5">
        {steps.map((step) => (
          <li key={step}>{step}</li>
        ))}
      </ol>
    </Disclosure>
  );
}
