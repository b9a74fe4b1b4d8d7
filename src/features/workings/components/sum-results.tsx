import type { ResultField } from "#shared/calculators/definition.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { headlinesOf, resultWords } from "../result-words.ts";

interface SumResultsProps {
  fields: readonly ResultField[];
  results: object;
  units: LengthUnits;
}

/** The results a person looks for first, large, beside the drawing that shows them. */
export function SumHeadlines({ fields, results, units }: SumResultsProps) {
  return (
    <dl className="grid grid-cols-[repeat(auto-fit,minmax(min(8rem,100%),1fr))] gap-x-4 gap-y-2">
      {headlinesOf(fields).map((field) => {
        const words = resultWords(field, results, units);
        return words ? (
          <div key={field.name} className="flex flex-col justify-between border-l-2 border-edge pl-2.5">
            <dt className="text-xs leading-tight text-ink-soft">{field.label}</dt>
            <dd className="figures text-base leading-tight font-semibold whitespace-nowrap">
              {words.figure} <span className="text-xs font-normal text-ink-soft">{words.unit}</span>
            </dd>
          </div>
        ) : null;
      })}
    </dl>
  );
}

/** Every number the sum gave, in runs under their headings. */
export function SumResults({ fields, results, units }: SumResultsProps) {
  const sections = [...new Set(fields.map((field) => field.section))];
  const [first, ...others] = sections.map((section) => (
    <table key={section ?? ""} className="w-full border-collapse text-sm">
      <caption className="pb-1 text-left font-semibold">{section ?? "Results"}</caption>
      <tbody>
        {fields
          .filter((field) => field.section === section)
          .map((field) => (
            <ResultRow key={field.name} field={field} words={resultWords(field, results, units)} />
          ))}
      </tbody>
    </table>
  ));
  return (
    <div className="grid items-start gap-x-8 gap-y-4 @lg:grid-cols-2">
      {first}
      {others.length > 0 ? <div className="flex flex-col gap-4">{others}</div> : null}
    </div>
  );
}

function ResultRow({ field, words }: { field: ResultField; words: ReturnType<typeof resultWords> }) {
  if (!words) return null;
  return (
    <tr className="border-t border-hairline">
      <th scope="row" className="py-1.5 pr-3 text-left align-baseline font-normal">
        {field.label}
        <span className="block text-xs text-ink-soft">{field.meaning}</span>
      </th>
      <td className="figures py-1.5 text-right align-baseline font-semibold whitespace-nowrap">
        {words.figure}{" "}
        <span className="inline-block w-7 text-left font-normal text-ink-soft">{words.unit}</span>
      </td>
    </tr>
  );
}
