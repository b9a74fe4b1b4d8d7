import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import { runCalculator } from "#shared/calculators/registry.ts";
import { formatLength, type LengthUnits } from "#shared/units/length.ts";
import { DataTable } from "#src/components/data-table.tsx";
import { type Leaf, leavesOf } from "../number-leaves.ts";
import { headlinesOf, resultWords } from "../result-words.ts";
import { typedFrom } from "../sum.ts";
import { type NumberField, unitOf } from "../typed-number.ts";

interface NotesProps {
  definition: CalculatorDefinition;
  units: LengthUnits;
}

/** One sum from what is given to what comes out, to be followed with a pencil. */
function WorkedExample({ definition, units }: NotesProps) {
  const run = runCalculator(definition.id, definition.example);
  if (!run.ok) return null;
  const { inputs, results } = run.value;
  const typed = typedFrom(definition, inputs, units);
  const numbers = leavesOf(definition.fields, 40).filter(
    ({ path, field }) => typed[path] && !(field.kind === "number" && field.minor),
  );
  const steps = definition.steps?.(inputs, results, (length) => formatLength(length, units, 1)) ?? [];
  return (
    <ol className="flex list-decimal flex-col gap-4 pl-6">
      <li>
        <p>Given:</p>
        <ul className="figures mt-1 flex flex-col gap-1 text-xs">
          {numbers.map(({ path, label, field }) => (
            <li key={path}>
              {`${label} = ${typed[path]} ${field.kind === "number" ? unitOf(field, units) : ""}`.trimEnd()}
            </li>
          ))}
        </ul>
      </li>
      <li>
        <p>Put into:</p>
        <ul className="figures mt-1 flex flex-col gap-1 text-xs">
          {definition.method.formula.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      </li>
      <li>
        <p>Comes to:</p>
        <ul className="figures mt-1 flex flex-col gap-1 text-xs">
          {headlinesOf(definition.resultFields).map((field) => {
            const words = resultWords(field, results, units);
            return words ? (
              <li key={field.name}>{`${field.label} = ${words.figure} ${words.unit}`}</li>
            ) : null;
          })}
        </ul>
      </li>
      {steps.map((step) => (
        <li key={step}>{step}</li>
      ))}
    </ol>
  );
}

/** What each number may be. */
function InputLimits({ definition, units }: NotesProps) {
  const show = (field: NumberField, limit: number) =>
    field.unit === "mm" ? formatLength(limit, units, field.decimals) : `${limit} ${field.unit}`.trim();
  return (
    <DataTable
      caption="Limits of the inputs"
      captionHidden
      rowKey={({ path }) => path}
      rows={leavesOf(definition.fields, 0).filter(isNumber)}
      columns={[
        { key: "input", head: "Input", rowHead: true, cell: ({ label }) => label },
        { key: "least", head: "Least", numeric: true, cell: ({ field }) => show(field, field.min) },
        { key: "most", head: "Most", numeric: true, cell: ({ field }) => show(field, field.max) },
      ]}
    />
  );
}

const isNumber = (leaf: Leaf): leaf is Leaf & { field: NumberField } => leaf.field.kind === "number";

/** What the panel leaves unsaid: the example followed through, the limits, where it is all from. */
export function CalculatorNotes({ definition, units }: NotesProps) {
  return (
    <div className="mt-12 grid gap-x-12 gap-y-10 font-sans text-sm lg:grid-cols-2">
      <section aria-labelledby="worked-example">
        <h2 id="worked-example" className="mb-3 text-lg">
          Worked example
        </h2>
        <WorkedExample definition={definition} units={units} />
        <p className="mt-4 max-w-measure">{definition.method.explanation}</p>
      </section>
      <section aria-labelledby="input-limits">
        <h2 id="input-limits" className="mb-3 text-lg">
          Limits
        </h2>
        <InputLimits definition={definition} units={units} />
        <h2 className="mt-8 mb-3 text-lg">Sources</h2>
        <ul className="flex list-disc flex-col gap-1 pl-5">
          {definition.method.sources.map((source) => (
            <li key={source}>{source}</li>
          ))}
        </ul>
      </section>
    </div>
  );
}
