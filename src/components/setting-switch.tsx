import { clsx } from "clsx";
import { type FormEvent, useState } from "react";

export type SettingChoice<Value extends string> = { value: Value; label: string };

type SettingSwitchProps<Value extends string> = {
  legend: string;
  /** Name of the form field and of the cookie. */
  name: string;
  value: Value;
  choices: readonly SettingChoice<Value>[];
  /** Where the form is posted without JavaScript; the server sets the cookie and comes back. */
  action: string;
  onChoose: (value: Value) => void;
};

const oneYear = 31_536_000;

/** A setting kept in a cookie: posted without JavaScript; with it, set at once. */
export function SettingSwitch<Value extends string>(props: SettingSwitchProps<Value>) {
  const { legend, name, value, choices, action, onChoose } = props;
  const [chosen, setChosen] = useState(value);
  const handleSubmit = (event: FormEvent<HTMLFormElement>) => {
    const { submitter } = event.nativeEvent as SubmitEvent;
    const next = choices.find((choice) => choice.value === submitter?.getAttribute("value"))?.value;
    if (!next) return;
    event.preventDefault();
    // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is missing in browsers we serve
    document.cookie = `${name}=${next}; path=/; max-age=${oneYear}; samesite=lax`;
    setChosen(next);
    onChoose(next);
  };
  return (
    <form method="post" action={action} onSubmit={handleSubmit}>
      <fieldset className="flex flex-wrap items-center gap-x-1">
        <legend className="float-left mr-2 text-xs text-ink-soft">{legend}</legend>
        {choices.map((choice) => (
          <button
            key={choice.value}
            type="submit"
            name={name}
            value={choice.value}
            aria-pressed={chosen === choice.value}
            className={clsx(
              "min-h-11 cursor-pointer rounded px-3 text-xs text-ink-soft hover:text-ink",
              chosen === choice.value && "chalk-stroke font-semibold text-ink!",
            )}
          >
            {choice.label}
          </button>
        ))}
      </fieldset>
    </form>
  );
}
