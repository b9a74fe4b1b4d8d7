import { z } from "zod";

interface FieldText {
  label: string;
  help: string;
}

/** What is said once about a number; its zod schema and its form field are both made from it. */
export interface NumberSpec extends FieldText {
  unit: string;
  min: number;
  max: number;
  /** How far one press of an arrow key moves it. */
  step: number;
  decimals: number;
  /** Rarely changed: the screen folds it away. */
  minor?: boolean;
}

export interface ChoiceSpec extends FieldText {
  choices: readonly { value: string; label: string }[];
}

interface FieldBase extends FieldText {
  name: string;
  optional: boolean;
  default?: unknown;
}

/** One input as a form, the API description or the command line's help needs to know it. */
export type InputField =
  | (FieldBase & NumberSpec & { kind: "number" })
  | (FieldBase & ChoiceSpec & { kind: "choice" })
  | (FieldBase & { kind: "switch" })
  | (FieldBase & { kind: "group"; fields: readonly InputField[] })
  | (FieldBase & { kind: "list"; item: InputField });

const between = ({ label, min, max, unit }: NumberSpec) =>
  `${label} must be between ${min} and ${max}${unit && ` ${unit}`}.`;

/** Schema of a number with its limits; messages name the field and the limit. */
export function numberInput(spec: NumberSpec) {
  const missing = `Give ${spec.label.toLowerCase()} as a number${spec.unit && ` in ${spec.unit}`}.`;
  return z
    .number({ error: missing })
    .min(spec.min, between(spec))
    .max(spec.max, between(spec))
    .meta({ kind: "number", ...spec });
}

/** As `numberInput`, for counts. */
export function countInput(spec: Omit<NumberSpec, "decimals">) {
  const full = { ...spec, decimals: 0 };
  return numberInput(full)
    .refine(Number.isInteger, `${spec.label} must be a whole number.`)
    .meta({ kind: "number", ...full });
}

/** Schema of one out of a few named values. */
export function choiceInput<const Choices extends readonly { value: string; label: string }[]>(
  spec: FieldText & { choices: Choices },
) {
  const values = spec.choices.map((choice) => choice.value) as Choices[number]["value"][];
  return z
    .enum(values, { error: `${spec.label} must be one of: ${values.join(", ")}.` })
    .meta({ kind: "choice", ...spec });
}

/** Lists the fields of an input schema, nested ones included, in the order they are written. */
export function describeInputs(schema: z.ZodObject): InputField[] {
  return Object.entries(schema.shape).map(([name, field]) => describeField(name, field as z.ZodType));
}

function describeField(name: string, schema: z.ZodType): InputField {
  const { inner, optional, fallback } = unwrap(schema);
  const spec = { ...inner.meta(), ...schema.meta() };
  const base = { name, optional, label: name, help: "", ...spec };
  const field = fallback === undefined ? base : { ...base, default: fallback };
  if (inner instanceof z.ZodObject) return { ...field, kind: "group", fields: describeInputs(inner) };
  if (inner instanceof z.ZodArray) {
    return { ...field, kind: "list", item: describeField("item", inner.element as z.ZodType) };
  }
  if (inner instanceof z.ZodBoolean) return { ...field, kind: "switch" };
  if (spec.kind === "number" || spec.kind === "choice") return field as InputField;
  throw new Error(`Input ${name} has no description: make it with numberInput or choiceInput`);
}

function unwrap(schema: z.ZodType) {
  let inner = schema;
  let optional = false;
  let fallback: unknown;
  while (inner instanceof z.ZodDefault || inner instanceof z.ZodOptional) {
    optional = true;
    if (inner instanceof z.ZodDefault) fallback = inner.def.defaultValue;
    inner = inner.unwrap() as z.ZodType;
  }
  return { inner, optional, fallback };
}
