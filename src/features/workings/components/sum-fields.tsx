import type { CalculatorIssue } from "#shared/calculators/definition.ts";
import type { InputField } from "#shared/calculators/inputs.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { Disclosure } from "#src/components/disclosure.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { stepped, type Typed, unitOf } from "../sum.ts";

interface SumFieldsProps {
  fields: readonly InputField[];
  typed: Typed;
  issue: CalculatorIssue | null;
  units: LengthUnits;
  onChange(name: string, text: string): void;
}

type NumberFields = Extract<InputField, { kind: "number" }>[];

/** The inputs as a form; the rarely changed ones folded away, unless one of them is at fault. */
export function SumFields(props: SumFieldsProps) {
  const numbers = props.fields.filter((field) => field.kind === "number");
  const minor = numbers.filter((field) => field.minor);
  return (
    <div className="flex flex-col gap-4">
      <FieldGrid {...props} numbers={numbers.filter((field) => !field.minor)} />
      {minor.length > 0 ? (
        <Disclosure
          summary="Paper and allowance"
          open={minor.some((field) => field.name === props.issue?.field) || undefined}
        >
          <FieldGrid {...props} numbers={minor} />
        </Disclosure>
      ) : null}
    </div>
  );
}

function FieldGrid({ numbers, typed, issue, units, onChange }: SumFieldsProps & { numbers: NumberFields }) {
  return (
    <div className="grid items-start gap-4 @sm:grid-cols-2 @xl:grid-cols-3">
      {numbers.map((field) => (
        <TextField
          key={field.name}
          name={field.name}
          label={field.label}
          help={field.help}
          {...(unitOf(field, units) && { unit: unitOf(field, units) })}
          error={issue?.field === field.name ? issue.message : undefined}
          // A decimal keypad has no slash for fractions of an inch, and on some phones no minus.
          inputMode={units === "inch" || field.min < 0 ? "text" : "decimal"}
          autoComplete="off"
          value={typed[field.name] ?? ""}
          onChange={(event) => onChange(field.name, event.target.value)}
          onKeyDown={(event) => {
            const presses = { ArrowUp: 1, ArrowDown: -1 }[event.key];
            const text =
              presses &&
              stepped(field, event.currentTarget.value, units, presses * (event.shiftKey ? 10 : 1));
            if (!text) return;
            event.preventDefault();
            onChange(field.name, text);
          }}
        />
      ))}
    </div>
  );
}
