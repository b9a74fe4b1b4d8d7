import { clsx } from "clsx";
import { type ComponentProps, type ReactNode, useId } from "react";
import type { InputField } from "#shared/calculators/inputs.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { FieldMessage } from "#src/components/field-message.tsx";
import { stepped, understood, unitOf } from "../typed-number.ts";

type SimpleField = Extract<InputField, { kind: "number" | "choice" | "switch" | "text" }>;

interface SumFieldProps {
  field: SimpleField;
  /** In place of the field's own label, inside a point or a list. */
  label?: string;
  path: string;
  text: string;
  error: string | undefined;
  units: LengthUnits;
  onChange(text: string): void;
}

/** One box. Label, box and message each lie in a row of the grid, so that the boxes of a row stand in line. */
export function SumField(props: SumFieldProps) {
  const { field, label = field.label, path, text, error, units } = props;
  const id = useId();
  const said = field.kind === "number" ? understood(field, text, units) : undefined;
  const control = {
    id,
    name: path,
    "aria-invalid": error ? true : undefined,
    "aria-describedby":
      clsx(field.help && `${id}-help`, said && `${id}-said`, error && `${id}-error`) || undefined,
  } as const;
  return (
    <div className="row-span-3 grid grid-rows-subgrid gap-y-1">
      <label htmlFor={id} className="self-end text-xs leading-tight font-semibold">
        {label}
      </label>
      <Control {...props} control={control} />
      <div className="pb-2 empty:pb-1">
        {/* Read out with the box; for the eye it stands under "What these are". */}
        {field.help ? (
          <span id={`${id}-help`} hidden>
            {field.help}
          </span>
        ) : null}
        {said ? (
          <p id={`${id}-said`} className="figures text-right text-xs text-ink-soft">
            {said}
          </p>
        ) : null}
        {error ? (
          <FieldMessage id={`${id}-error`} kind="error">
            {error}
          </FieldMessage>
        ) : null}
      </div>
    </div>
  );
}

type ControlParts = Pick<ComponentProps<"input">, "id" | "name" | "aria-invalid" | "aria-describedby">;

function Control(props: SumFieldProps & { control: ControlParts }): ReactNode {
  const { field, path, text, units, control, onChange } = props;
  if (field.kind === "choice") {
    return (
      <select
        {...(control as ComponentProps<"select">)}
        className="control"
        value={text}
        onChange={(event) => onChange(event.target.value)}
      >
        {text === "" || field.optional ? <option value="">Choose…</option> : null}
        {field.choices.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
    );
  }
  if (field.kind === "switch") {
    return (
      <span className="flex min-h-11 items-center">
        {/* An empty tick box sends nothing: without JavaScript this says that it is empty. */}
        <input type="hidden" name={path} value="false" />
        <input
          {...control}
          type="checkbox"
          className="control-tick"
          value="true"
          checked={text === "true"}
          onChange={(event) => onChange(String(event.target.checked))}
        />
      </span>
    );
  }
  if (field.kind === "text") {
    return (
      <input
        {...control}
        className="control"
        autoComplete="off"
        maxLength={field.maxLength}
        value={text}
        onChange={(event) => onChange(event.target.value)}
      />
    );
  }
  const unit = unitOf(field, units);
  const box = (
    <input
      {...control}
      className="control px-2! text-right"
      // A decimal keypad has no slash for sums and fractions; a plain one has both.
      inputMode="text"
      autoComplete="off"
      autoCapitalize="off"
      spellCheck={false}
      value={text}
      onChange={(event) => onChange(event.target.value)}
      onKeyDown={(event) => {
        const presses = { ArrowUp: 1, ArrowDown: -1 }[event.key];
        const next = presses && stepped(field, text, units, presses * (event.shiftKey ? 10 : 1));
        if (!next) return;
        event.preventDefault();
        onChange(next);
      }}
    />
  );
  if (!unit) return box;
  return (
    <div className="control-with-unit">
      {box}
      <span className="control-unit min-w-9! px-1.5!">{unit}</span>
    </div>
  );
}
