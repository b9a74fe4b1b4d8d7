import { clsx } from "clsx";
import ChevronDown from "lucide-react/icons/chevron-down";
import type { ComponentProps, ReactNode } from "react";
import { FieldFrame } from "./field-frame.tsx";
import { useFieldIds } from "./use-field-ids.ts";

export type SelectOption = { value: string; label: string; disabled?: boolean };

type SelectFieldProps = ComponentProps<"select"> & {
  label: ReactNode;
  options: SelectOption[];
  help?: ReactNode;
  error?: ReactNode;
  optional?: boolean;
  frameClassName?: string;
};

/** The system's own list: it works with gloves, on a phone and without JavaScript. */
export function SelectField(props: SelectFieldProps) {
  const { label, options, help, error, optional, frameClassName, className, id: given, ...select } = props;
  const { id, helpId, errorId, describedBy } = useFieldIds(given, help, error);
  return (
    <FieldFrame {...{ id, helpId, errorId, label, help, error, optional }} className={frameClassName}>
      <div className="relative">
        <select
          {...select}
          id={id}
          className={clsx("control control-select", className)}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
        </select>
        <ChevronDown
          aria-hidden="true"
          className="pointer-events-none absolute top-1/2 right-3 size-5 -translate-y-1/2 text-ink-soft"
        />
      </div>
    </FieldFrame>
  );
}
