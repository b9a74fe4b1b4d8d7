import { clsx } from "clsx";
import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import { type Paper, tileSheet } from "#shared/templates/tiling.ts";
import { type ButtonTone, buttonClass } from "#src/components/button-class.ts";
import { numberAddresses, templateAddresses } from "../template-addresses.ts";

interface FileLinksProps {
  /** The kept working in the API; without it files are made from the numbers alone. */
  base: string | undefined;
  definition: CalculatorDefinition;
  inputs: Record<string, unknown>;
  results: object;
  changed: boolean;
  stale: boolean;
}

/** What leaves the site as a file, with the numbers on the screen in it. Plain links: they work without JavaScript. */
export function FileLinks({ base, definition, inputs, results, changed, stale }: FileLinksProps) {
  const where = base ?? `/api/calculators/${definition.id}`;
  const sent = base && !changed ? {} : inputs;
  const sheet = definition.template?.(inputs, results, { build: "", working: "", date: "" });
  const fault = (paper: Paper | undefined) => {
    const tiling = sheet && paper ? tileSheet(sheet.bounds, paper) : undefined;
    return tiling && !tiling.ok ? tiling.issue.message : undefined;
  };
  const tooLarge = fault("a4") ?? fault("letter");
  const files = templateAddresses(where, sent).filter(({ paper }) => !fault(paper));
  const from = stale ? "from the last numbers that worked" : "with these numbers";
  return (
    <div className="flex flex-wrap gap-x-8 gap-y-3">
      {sheet ? (
        <div>
          <p className="mb-1.5 max-w-measure text-xs text-chalk-soft">
            {`Full-size template, ${from}. Print at 100 % and measure the check bar.`}
          </p>
          {tooLarge ? <p className="mb-1.5 text-xs">{tooLarge}</p> : null}
          <Links links={files} first="primary" />
        </div>
      ) : null}
      <div>
        <p className="mb-1.5 text-xs text-chalk-soft">
          {stale ? "The last numbers that worked." : "The numbers."}
        </p>
        <Links links={numberAddresses(where, sent)} first="plain" />
      </div>
    </div>
  );
}

function Links({ links, first }: { links: { label: string; href: string }[]; first: ButtonTone }) {
  return (
    <div className="flex flex-wrap gap-2">
      {links.map(({ label, href }, index) => (
        <a key={label} href={href} className={clsx(buttonClass(index === 0 ? first : "plain"), "px-3!")}>
          {label}
        </a>
      ))}
    </div>
  );
}
