import { type ComponentProps, useState } from "react";
import { FieldFrame } from "#src/components/field-frame.tsx";
import { useFieldIds } from "#src/components/use-field-ids.ts";

type PasswordFieldProps = Omit<ComponentProps<"input">, "type"> & {
  label: string;
  help?: string;
  error?: string | undefined;
  autoComplete: "current-password" | "new-password";
};

/** A password that can be looked at while it is typed. */
export function PasswordField({ label, help, error, id: given, ...input }: PasswordFieldProps) {
  const { id, helpId, errorId, describedBy } = useFieldIds(given, help, error);
  const [shown, setShown] = useState(false);
  return (
    <FieldFrame {...{ id, helpId, errorId, label, help, error }}>
      <div className="relative">
        <input
          {...input}
          id={id}
          type={shown ? "text" : "password"}
          autoCapitalize="none"
          spellCheck={false}
          className="control pr-20"
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy}
        />
        <button
          type="button"
          aria-controls={id}
          aria-pressed={shown}
          onClick={() => setShown(!shown)}
          className="absolute inset-y-0 right-0 min-h-11 min-w-16 cursor-pointer rounded px-3 font-semibold text-temper text-xs hover:bg-temper-wash"
        >
          {shown ? "Hide" : "Show"}
          <span className="sr-only"> the {label.toLowerCase()}</span>
        </button>
      </div>
    </FieldFrame>
  );
}
