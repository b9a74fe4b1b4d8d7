import { useId } from "react";
import { Button } from "./button.tsx";

type ProgressProps = {
  label: string;
  /** 0 to 1; leave out while the length of the work is unknown. */
  value?: number;
  detail?: string;
  onCancel?: () => void;
  cancelLabel?: string;
};

export function Progress({ label, value, detail, onCancel, cancelLabel = "Cancel" }: ProgressProps) {
  const id = useId();
  const percent = value === undefined ? undefined : `${Math.round(value * 100)}%`;
  return (
    <div className="flex flex-wrap items-end gap-x-4 gap-y-2">
      <div className="min-w-48 flex-1">
        <div className="mb-1.5 flex justify-between gap-4">
          <label htmlFor={id} className="font-semibold leading-snug">
            {label}
          </label>
          <span className="figures text-xs text-ink-soft">{detail ?? percent}</span>
        </div>
        <progress id={id} className="progress" max={1} {...(value === undefined ? {} : { value })} />
      </div>
      {onCancel ? <Button onClick={onCancel}>{cancelLabel}</Button> : null}
    </div>
  );
}
