import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import { type Paper, tileSheet } from "#shared/templates/tiling.ts";
import { buttonClass } from "#src/components/button-class.ts";
import { templateAddresses } from "../template-addresses.ts";

interface TemplateLinksProps {
  /** Where the kept working's templates are; without it they are drawn from the numbers alone. */
  base: string | undefined;
  definition: CalculatorDefinition;
  inputs: Record<string, unknown>;
  results: object;
  changed: boolean;
  stale: boolean;
}

/** The template as files, with the numbers on the screen in them. Plain links: they work without JavaScript. */
export function TemplateLinks({ base, definition, inputs, results, changed, stale }: TemplateLinksProps) {
  const where = base ?? `/api/calculators/${definition.id}/template`;
  const links = templateAddresses(where, base && !changed ? {} : inputs);
  const sheet = definition.template?.(inputs, results, { build: "", working: "", date: "" });
  const fault = (paper: Paper | undefined) => {
    const tiling = sheet && paper ? tileSheet(sheet.bounds, paper) : undefined;
    return tiling && !tiling.ok ? tiling.issue.message : undefined;
  };
  const tooLarge = fault("a4") ?? fault("letter");
  return (
    <div className="flex flex-col gap-2">
      <p className="text-xs text-chalk-soft">
        {stale
          ? "Full-size template, from the last numbers that worked:"
          : "Full-size template with these numbers. Print at 100 % and measure the check bar:"}
      </p>
      {tooLarge ? <p className="text-xs">{tooLarge}</p> : null}
      <div className="flex flex-wrap gap-2">
        {links
          .filter(({ paper }) => !fault(paper))
          .map(({ label, href }, index) => (
            <a key={label} href={href} className={buttonClass(index === 0 ? "primary" : "plain")}>
              {label}
            </a>
          ))}
      </div>
    </div>
  );
}
