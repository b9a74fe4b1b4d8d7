import type { ComponentProps, ReactNode } from "react";
import { FieldMessage } from "./field-message.tsx";
import { useFieldIds } from "./use-field-ids.ts";

type CheckboxFieldProps = Omit<ComponentProps<"input">, "type"> & {
  label: ReactNode;
  help?: ReactNode;
  error?: ReactNode;
};

export function CheckboxField({ label, help, error, id: given, ...input }: CheckboxFieldProps) {
  const { id, helpId, errorId, describedBy } = useFieldIds(given, help, error);
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="flex min-h-11 cursor-pointer items-center gap-3 py-1">
        <input
          {...input}
          id={id}
          type="checkbox"
          className="control-tick"
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy}
        />
        <span className="leading-snug">{label}</span>
      </label>
      <div className="flex flex-col -mt-2 gap-1 pl-9 empty:hidden">
        {help ? (
          <FieldMessage id={helpId} kind="help">
            {help}
          </FieldMessage>
        ) : null}
        {error ? (
          <FieldMessage id={errorId} kind="error">
            {error}
          </FieldMessage>
        ) : null}
      </div>
    </div>
  );
}
