import type { Ref } from "react";
import { Mark } from "./mark.tsx";

type FormErrorSummaryProps = {
  errors: { fieldId: string; message: string }[];
  title?: string;
  /** Focus it after a failed submit, so that it is read out. */
  ref?: Ref<HTMLDivElement>;
};

/** What stops a form, at its head, each line leading to its field. Nothing without errors. */
export function FormErrorSummary({ errors, title, ref }: FormErrorSummaryProps) {
  if (errors.length === 0) return null;
  const heading =
    title ?? (errors.length === 1 ? "One thing needs changing" : `${errors.length} things need changing`);
  return (
    <div ref={ref} role="alert" tabIndex={-1} className="rounded border-2 border-signal bg-signal-wash p-4">
      <p className="flex items-center gap-2 font-semibold">
        <Mark shape="cross" className="size-4 text-signal" />
        {heading}
      </p>
      <ul className="mt-1 flex flex-col pl-6">
        {errors.map((error) => (
          <li key={error.fieldId}>
            <a href={`#${error.fieldId}`} className="inline-flex min-h-11 items-center text-ink!">
              {error.message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}
