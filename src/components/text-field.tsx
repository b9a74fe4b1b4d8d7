import { clsx } from "clsx";
import type { ComponentProps, ReactNode } from "react";
import { FieldFrame } from "./field-frame.tsx";
import { useFieldIds } from "./use-field-ids.ts";

type TextFieldProps = ComponentProps<"input"> & {
  label: ReactNode;
  help?: ReactNode;
  error?: ReactNode;
  optional?: boolean;
  /** Stamped on the field's end; the figure is then set in mono and to the right. */
  unit?: string;
  frameClassName?: string;
};

export function TextField(props: TextFieldProps) {
  const { label, help, error, optional, unit, frameClassName, className, id: given, ...input } = props;
  const { id, helpId, errorId, describedBy } = useFieldIds(given, help, error);
  const unitId = `${id}-unit`;
  const control = (
    <input
      {...input}
      id={id}
      className={clsx("control", className)}
      aria-invalid={error ? true : undefined}
      aria-describedby={clsx(unit && unitId, describedBy) || undefined}
    />
  );
  return (
    <FieldFrame {...{ id, helpId, errorId, label, help, error, optional }} className={frameClassName}>
      {unit ? (
        <div className="control-with-unit">
          {control}
          <span id={unitId} className="control-unit">
            {unit}
          </span>
        </div>
      ) : (
        control
      )}
    </FieldFrame>
  );
}
