import type { ComponentProps, ReactNode } from "react";
import { FieldMessage } from "./field-message.tsx";
import { useFieldIds } from "./use-field-ids.ts";

export type RadioOption = { value: string; label: ReactNode; help?: ReactNode; disabled?: boolean };

type RadioGroupProps = {
  legend: ReactNode;
  name: string;
  options: RadioOption[];
  value?: string;
  defaultValue?: string;
  onChange?: (value: string) => void;
  help?: ReactNode;
  error?: ReactNode;
  /** Passed to every radio, for form libraries that register by ref and name. */
  inputProps?: ComponentProps<"input">;
};

export function RadioGroup(props: RadioGroupProps) {
  const { legend, name, options, value, defaultValue, onChange, help, error, inputProps } = props;
  const { helpId, errorId, describedBy } = useFieldIds(undefined, help, error);
  return (
    <fieldset aria-describedby={describedBy} className="flex flex-col gap-1">
      <legend className="mb-1 font-semibold leading-snug">{legend}</legend>
      {help ? (
        <FieldMessage id={helpId} kind="help">
          {help}
        </FieldMessage>
      ) : null}
      {options.map((option) => (
        <label key={option.value} className="flex min-h-11 cursor-pointer items-start gap-3 py-2">
          <input
            {...inputProps}
            type="radio"
            name={name}
            value={option.value}
            disabled={option.disabled}
            className="control-tick"
            aria-invalid={error ? true : undefined}
            {...(value === undefined
              ? { defaultChecked: defaultValue === option.value }
              : { checked: value === option.value })}
            {...(onChange ? { onChange: () => onChange(option.value) } : {})}
          />
          <span className="leading-snug">
            {option.label}
            {option.help ? <span className="block text-xs text-ink-soft">{option.help}</span> : null}
          </span>
        </label>
      ))}
      {error ? (
        <FieldMessage id={errorId} kind="error">
          {error}
        </FieldMessage>
      ) : null}
    </fieldset>
  );
}
