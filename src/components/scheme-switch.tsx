import { clsx } from "clsx";
import { type FormEvent, useState } from "react";

export type Scheme = "light" | "dark" | "system";

const schemes: { value: Scheme; label: string }[] = [
  { value: "system", label: "As the system" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
];

const oneYear = 31_536_000;

/** Posts `scheme` to the server without JavaScript; with it, sets the cookie and the page at once. */
export function SchemeSwitch({ scheme, action = "/scheme" }: { scheme: Scheme; action?: string }) {
  const [chosen, setChosen] = useState(scheme);
  const handleSubmit = (event: FormEvent<HTMLFormElement>) => {
    const { submitter } = event.nativeEvent as SubmitEvent;
    const next = schemes.find(({ value }) => submitter?.getAttribute("value") === value)?.value;
    if (!next) return;
    event.preventDefault();
    applyScheme(next);
    setChosen(next);
  };
  return (
    <form method="post" action={action} onSubmit={handleSubmit}>
      <fieldset className="flex flex-wrap items-center gap-x-1">
        <legend className="sr-only">Colours</legend>
        {schemes.map(({ value, label }) => (
          <button
            key={value}
            type="submit"
            name="scheme"
            value={value}
            aria-pressed={chosen === value}
            className={clsx(
              "min-h-11 cursor-pointer rounded px-3 text-xs text-ink-soft hover:text-ink",
              chosen === value && "chalk-stroke font-semibold text-ink!",
            )}
          >
            {label}
          </button>
        ))}
      </fieldset>
    </form>
  );
}

function applyScheme(scheme: Scheme): void {
  // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is missing in browsers we serve
  document.cookie = `scheme=${scheme}; path=/; max-age=${oneYear}; samesite=lax`;
  document.documentElement.dataset.scheme = scheme;
}
