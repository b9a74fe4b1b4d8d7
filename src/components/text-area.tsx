import { clsx } from "clsx";
import type { ComponentProps, ReactNode } from "react";
import { FieldFrame } from "./field-frame.tsx";
import { useFieldIds } from "./use-field-ids.ts";

type TextAreaProps = ComponentProps<"textarea"> & {
  label: ReactNode;
  help?: ReactNode;
  error?: ReactNode;
  optional?: boolean;
  frameClassName?: string;
};

export function TextArea(props: TextAreaProps) {
  const { label, help, error, optional, frameClassName, className, id: given, rows = 4, ...area } = props;
  const { id, helpId, errorId, describedBy } = useFieldIds(given, help, error);
  return (
    <FieldFrame {...{ id, helpId, errorId, label, help, error, optional }} className={frameClassName}>
      <textarea
        {...area}
        id={id}
        rows={rows}
        className={clsx("control min-h-28 field-sizing-content", className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy}
      />
    </FieldFrame>
  );
}
