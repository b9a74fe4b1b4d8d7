import { clsx } from "clsx";
import { type ReactNode, useEffect, useState, useSyncExternalStore } from "react";
import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import type { InputField } from "#shared/calculators/inputs.ts";
import { findCalculator } from "#shared/calculators/registry.ts";
import { formatLength, type LengthUnits } from "#shared/units/length.ts";
import { Button } from "#src/components/button.tsx";
import { Disclosure } from "#src/components/disclosure.tsx";
import { LiveRegion } from "#src/components/live-region.tsx";
import { Notice } from "#src/components/notice.tsx";
import { NumberTag } from "#src/components/number-tag.tsx";
import { Plate } from "#src/components/plate.tsx";
import { drawings } from "../drawings.ts";
import { headlinesOf, resultWords } from "../result-words.ts";
import type { Typed } from "../sum.ts";
import { useWorkingSum } from "../use-working-sum.ts";
import { FileLinks } from "./file-links.tsx";
import { HeldNumbers } from "./held-numbers.tsx";
import { OtherVersion } from "./other-version.tsx";
import { SolidView } from "./solid-view.tsx";
import { SumFields } from "./sum-fields.tsx";
import { SumCautions, SumMethod, SumSteps } from "./sum-method.tsx";
import { SumHeadlines, SumResults } from "./sum-results.tsx";

export interface PanelWorking {
  id: string;
  /** Null until it is kept in a build. */
  number: number | null;
  title: string;
  calculator: string;
  version: number;
  inputs: Record<string, unknown>;
  results: Record<string, unknown>;
}

export interface WorkingPanelProps {
  working: PanelWorking;
  /** `read`: numbers are tried and can be put back. `edit`: they are the builder's own and are handed on. */
  mode: "read" | "edit";
  units: LengthUnits;
  onInputsChange?: (inputs: Record<string, unknown>) => void;
  /** The kept working in the API; without it files are made from the numbers alone. */
  apiBase?: string;
  level?: 2 | 3 | 4;
  /** Small print in the title strip. */
  aside?: ReactNode;
  /** What stands in the fields at first when that is not the working's own numbers, as typed. */
  typed?: Typed;
  /** Where the form goes without JavaScript; without it a working is only read there. */
  formAction?: string;
  /** On the button that undoes changes. */
  putBackLabel?: string;
}

/** A working as everyone meets it: drawing, inputs, results, cautions, method, template. Complete without JavaScript. */
export function WorkingPanel(props: WorkingPanelProps) {
  const definition = findCalculator(props.working.calculator);
  if (!definition) {
    return <Notice kind="attention">This working needs a calculator that is no longer here.</Notice>;
  }
  return <Panel {...props} definition={definition} />;
}

function Panel({
  working,
  mode,
  units,
  onInputsChange,
  apiBase,
  level,
  aside,
  typed,
  formAction,
  putBackLabel = "Put back the builder's numbers",
  definition,
}: WorkingPanelProps & { definition: CalculatorDefinition }) {
  const sum = useWorkingSum(definition, working, units, onInputsChange, typed);
  const drawing = drawings[definition.id];
  const shown = { inputs: sum.shown.inputs, results: sum.shown.results, units };
  const beside = drawing !== undefined && fitsBeside(definition.fields);
  const live = useIsLive();
  const stale = sum.issue !== null;
  return (
    <Plate
      title={working.title || definition.name}
      {...(level && { level })}
      number={working.number === null ? null : <NumberTag>{`W${working.number}`}</NumberTag>}
      aside={aside ?? definition.name}
      actions={
        <FileLinks
          base={apiBase}
          definition={definition}
          {...shown}
          changed={sum.changed || mode === "edit"}
          stale={stale}
        />
      }
    >
      {/* With the room for it, the numbers stand beside the drawing that they move. */}
      <div className={clsx("grid gap-4", beside && "@3xl:grid-cols-[minmax(0,1fr)_16rem]")}>
        <div
          className={clsx("-mx-3 -mt-3 min-w-0 transition-opacity sm:-mx-4 sm:-mt-4", stale && "opacity-45")}
        >
          {drawing ? <drawing.flat {...shown} /> : null}
        </div>
        <div className="@container flex min-w-0 flex-col gap-4">
          <div className={clsx("transition-opacity", stale && "opacity-45")}>
            <SumHeadlines fields={definition.resultFields} {...shown} />
          </div>
          <form
            className="flex flex-col gap-3"
            {...(formAction && { method: "get", action: formAction })}
            aria-label={`Inputs of ${working.title || definition.name}`}
            onSubmit={(event) => event.preventDefault()}
          >
            <SumFields
              fields={definition.fields}
              typed={sum.typed}
              issue={sum.issue}
              units={units}
              onChange={sum.change}
            />
            {stale ? <StaleNotice issue={sum.issue} placed={Object.keys(sum.typed)} /> : null}
            {mode === "read" && sum.changed ? <Button onClick={sum.putBack}>{putBackLabel}</Button> : null}
            {formAction && units === "inch" ? <input type="hidden" name="units" value="inch" /> : null}
            {formAction && !live ? (
              <Button type="submit" tone="primary">
                Work it out
              </Button>
            ) : null}
          </form>
        </div>
      </div>
      <OtherVersion definition={definition} working={working} units={units} />
      {live ? (
        <div className="flex flex-wrap gap-2">
          {drawing?.solid ? <SolidView solid={drawing.solid} {...shown} /> : null}
          <HeldNumbers definition={definition} drawing={drawing?.flat} {...shown} />
        </div>
      ) : null}
      <div className="-space-y-px">
        <Disclosure summary="All results" className="shown-on-paper">
          <div className={clsx("transition-opacity", stale && "opacity-45")}>
            <SumResults fields={definition.resultFields} {...shown} />
          </div>
        </Disclosure>
        <Steps definition={definition} {...shown} />
        <SumMethod definition={definition} />
      </div>
      <SumCautions cautions={definition.cautions} />
      <Announcement
        changed={sum.changed}
        text={stale ? (sum.issue?.message ?? "") : spoken(definition, shown.results, units)}
      />
    </Plate>
  );
}

/** More boxes than stand as high as a drawing, or wide ones, go below it. */
function fitsBeside(fields: readonly InputField[]): boolean {
  const boxes = fields.filter((field) => field.kind !== "number" || !field.minor);
  return boxes.length <= 7 && boxes.every(({ kind }) => kind !== "point" && kind !== "list");
}

function StaleNotice({
  issue,
  placed,
}: {
  issue: { field: string; message: string } | null;
  placed: string[];
}) {
  return (
    <Notice kind="attention" title="Not worked out">
      {issue && !placed.includes(issue.field)
        ? issue.message
        : "The drawing and results are of the last numbers that worked."}
    </Notice>
  );
}

function Steps({
  definition,
  inputs,
  results,
  units,
}: {
  definition: CalculatorDefinition;
  inputs: Record<string, unknown>;
  results: object;
  units: LengthUnits;
}) {
  const steps = definition.steps?.(inputs, results, (length) => formatLength(length, units, 1));
  return steps ? <SumSteps steps={steps} /> : null;
}

function spoken(definition: CalculatorDefinition, results: object, units: LengthUnits): string {
  return headlinesOf(definition.resultFields)
    .slice(0, 4)
    .map((field) => {
      const words = resultWords(field, results, units);
      return words ? `${field.label} ${words.figure} ${words.unit}` : "";
    })
    .join(", ");
}

/** Says the results once typing has paused; a screen reader would otherwise be talked over at each key. */
function Announcement({ changed, text }: { changed: boolean; text: string }) {
  const [said, setSaid] = useState("");
  useEffect(() => {
    if (!changed) return;
    const timer = setTimeout(() => setSaid(text), 700);
    return () => clearTimeout(timer);
  }, [changed, text]);
  return <LiveRegion>{said}</LiveRegion>;
}

const never = () => () => {};

/** False on the server and until the page has come alive: for what does nothing without JavaScript. */
function useIsLive(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
