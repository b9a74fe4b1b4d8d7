import { clsx } from "clsx";
import type { ReactNode } from "react";
import { FieldMessage } from "./field-message.tsx";

type FieldFrameProps = {
  id: string;
  helpId: string;
  errorId: string;
  label: ReactNode;
  optional?: boolean;
  help?: ReactNode;
  error?: ReactNode;
  className?: string;
  children: ReactNode;
};

/** Label above, help under it, the control, then what is wrong with it. */
export function FieldFrame(props: FieldFrameProps) {
  const { id, helpId, errorId, label, optional, help, error, className, children } = props;
  return (
    <div className={clsx("flex flex-col gap-1.5", className)}>
      <label htmlFor={id} className="font-semibold leading-snug">
        {label}
        {optional ? <span className="font-normal text-ink-soft"> (optional)</span> : null}
      </label>
      {help ? (
        <FieldMessage id={helpId} kind="help">
          {help}
        </FieldMessage>
      ) : null}
      {children}
      {error ? (
        <FieldMessage id={errorId} kind="error">
          {error}
        </FieldMessage>
      ) : null}
    </div>
  );
}
