import { type ReactNode, useId } from "react";
import type { CalculatorIssue } from "#shared/calculators/definition.ts";
import type { InputField } from "#shared/calculators/inputs.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { Button } from "#src/components/button.tsx";
import { Disclosure } from "#src/components/disclosure.tsx";
import { FieldMessage } from "#src/components/field-message.tsx";
import { countOf, isSwitched, type Typed } from "../sum.ts";
import { withItem, withoutItem } from "../typed-lists.ts";
import { SumField } from "./sum-field.tsx";

interface SumFieldsProps {
  fields: readonly InputField[];
  typed: Typed;
  issue: CalculatorIssue | null;
  units: LengthUnits;
  onChange(typed: Typed): void;
}

type PlacedProps = Omit<SumFieldsProps, "fields">;

const isMinor = (field: InputField) => field.kind === "number" && field.minor === true;

/** The inputs as a form; the rarely changed ones folded away, unless one of them is at fault. */
export function SumFields({ fields, ...props }: SumFieldsProps) {
  const minor = fields.filter(isMinor);
  return (
    <div className="flex flex-col gap-2">
      <FieldGrid {...props} fields={fields.filter((field) => !isMinor(field))} within="" />
      <div className="-space-y-px">
        {minor.length > 0 ? (
          <Disclosure
            summary={foldTitle(minor)}
            open={minor.some((field) => field.name === props.issue?.field) || undefined}
          >
            <FieldGrid {...props} fields={minor} within="" />
          </Disclosure>
        ) : null}
        <Disclosure summary="What these are">
          <dl className="grid gap-x-6 gap-y-1.5 text-xs @lg:grid-cols-2">
            {helpOf(fields).map(({ label, help }) => (
              <div key={label}>
                <dt className="inline font-semibold">{label}: </dt>
                <dd className="inline text-ink-soft">{help}</dd>
              </div>
            ))}
          </dl>
        </Disclosure>
      </div>
    </div>
  );
}

/** Named by what is in it: "Paper thickness and 2 more". */
function foldTitle([first, ...others]: readonly InputField[]): string {
  const [second] = others;
  if (!first || !second) return first?.label ?? "";
  const more =
    others.length === 1
      ? second.label.charAt(0).toLowerCase() + second.label.slice(1)
      : `${others.length} more`;
  return `${first.label} and ${more}`;
}

function helpOf(fields: readonly InputField[]): { label: string; help: string }[] {
  const all = fields.flatMap((field) => [
    field,
    ...(field.kind === "group" ? field.fields : field.kind === "list" ? [field.item] : []),
    ...(field.kind === "list" && field.item.kind === "group" ? field.item.fields : []),
  ]);
  const told = new Map(all.filter(({ help }) => help).map(({ label, help }) => [label, help]));
  return [...told].map(([label, help]) => ({ label, help }));
}

/** Boxes stand in rows, points side by side, groups and lists across the whole; in the order they are given. */
function FieldGrid({
  fields,
  within,
  ...props
}: PlacedProps & { fields: readonly InputField[]; within: string }) {
  return runsOf(fields).map(({ kind, run }) => (
    <div key={run[0]?.name} className={grids[kind]}>
      {run.map((field) => (
        <PlacedField key={field.name} {...props} field={field} path={within + field.name} />
      ))}
    </div>
  ));
}

const grids = {
  boxes: "grid grid-cols-[repeat(auto-fill,minmax(min(8.5rem,100%),1fr))] gap-x-3",
  points: "grid gap-x-6 @lg:grid-cols-2 @3xl:grid-cols-3",
  blocks: "grid grid-cols-[minmax(0,1fr)]",
} as const;

function runsOf(fields: readonly InputField[]) {
  const runs: { kind: keyof typeof grids; run: InputField[] }[] = [];
  for (const field of fields) {
    const block = field.kind === "group" || field.kind === "list";
    const kind = block ? "blocks" : field.kind === "point" ? "points" : "boxes";
    const last = runs.at(-1);
    if (last?.kind === kind) last.run.push(field);
    else runs.push({ kind, run: [field] });
  }
  return runs;
}

type PlacedFieldProps = PlacedProps & { field: InputField; path: string; label?: string };

function PlacedField({ field, path, label, ...props }: PlacedFieldProps) {
  const { typed, issue, units, onChange } = props;
  const set = (text: string) => onChange({ ...typed, [path]: text });
  if (field.kind === "list") return <ListField {...props} field={field} path={path} />;
  if (field.kind === "point" || field.kind === "group") {
    const on = !isSwitched(field) || typed[path] === "on";
    return (
      <FieldSet label={label ?? field.label} path={path} issue={issue}>
        {isSwitched(field) ? <Switch path={path} on={on} label={field.label} onChange={set} /> : null}
        {on && field.kind === "point" ? <Axes {...props} field={field} path={path} /> : null}
        {on && field.kind === "group" ? (
          <FieldGrid {...props} fields={field.fields} within={`${path}.`} />
        ) : null}
      </FieldSet>
    );
  }
  const error = issue?.field === path ? issue.message : undefined;
  return (
    <SumField
      field={field}
      {...(label && { label })}
      path={path}
      text={typed[path] ?? ""}
      error={error}
      units={units}
      onChange={set}
    />
  );
}

/** The three numbers of a point, side by side. */
function Axes({
  field,
  path,
  ...props
}: PlacedProps & { field: Extract<InputField, { kind: "point" }>; path: string }) {
  const names = field.axes.map((axis) => axis.label.split(", ").at(-1) ?? axis.label);
  return (
    <div className="grid grid-cols-3 gap-x-2">
      {field.axes.map((axis, index) => (
        <PlacedField
          key={axis.name}
          {...props}
          field={axis}
          label={names[index] ?? axis.label}
          path={`${path}.${index}`}
        />
      ))}
    </div>
  );
}

function ListField({
  field,
  path,
  ...props
}: PlacedProps & { field: Extract<InputField, { kind: "list" }>; path: string }) {
  const { typed, units, onChange } = props;
  const count = countOf(typed, path);
  const one = field.item.label.toLowerCase();
  const small = field.item.kind === "number";
  return (
    <FieldSet label={field.label} path={path} issue={props.issue}>
      <input type="hidden" name={path} value={count} />
      <ol
        className={
          small
            ? "grid grid-cols-[repeat(auto-fill,minmax(min(13rem,100%),1fr))] gap-x-6"
            : "grid grid-cols-[minmax(0,1fr)]"
        }
      >
        {Array.from({ length: count }, (_, index) => (
          // Items have no identity of their own: they are what stands at that place.
          // biome-ignore lint/suspicious/noArrayIndexKey: the place is the identity
          <li key={index} className={small ? "flex items-start gap-2" : "relative"}>
            <div className="min-w-0 flex-1">
              <PlacedField
                {...props}
                field={field.item}
                label={`${field.item.label} ${index + 1}`}
                path={`${path}.${index}`}
              />
            </div>
            <Button
              tone="quiet"
              className={small ? "mt-5" : "absolute top-0 right-0"}
              aria-label={`Take out ${one} ${index + 1}`}
              onClick={() => onChange(withoutItem(typed, path, index))}
            >
              ×
            </Button>
          </li>
        ))}
      </ol>
      <div>
        <Button
          type="submit"
          name={path}
          value={count + 1}
          onClick={(event) => {
            event.preventDefault();
            onChange(withItem(typed, field, path, units));
          }}
        >
          Add {one}
        </Button>
      </div>
    </FieldSet>
  );
}

interface FieldSetProps {
  label: string;
  path: string;
  issue: CalculatorIssue | null;
  children: ReactNode;
}

function FieldSet({ label, path, issue, children }: FieldSetProps) {
  const errorId = useId();
  const error = issue?.field === path ? issue.message : undefined;
  return (
    <fieldset
      className="min-w-0 border-t border-hairline pt-2 pb-2"
      aria-describedby={error ? errorId : undefined}
    >
      <legend className="float-left w-full pb-1 text-xs font-semibold">{label}</legend>
      <div className="clear-both flex flex-col gap-1">{children}</div>
      {error ? (
        <FieldMessage id={errorId} kind="error">
          {error}
        </FieldMessage>
      ) : null}
    </fieldset>
  );
}

function Switch({
  path,
  on,
  label,
  onChange,
}: {
  path: string;
  on: boolean;
  label: string;
  onChange(text: string): void;
}) {
  return (
    <label className="flex min-h-11 cursor-pointer items-center gap-3 text-xs">
      <input
        type="checkbox"
        className="control-tick"
        name={path}
        value="on"
        checked={on}
        onChange={(event) => onChange(event.target.checked ? "on" : "")}
      />
      Give {label.toLowerCase()}
    </label>
  );
}
