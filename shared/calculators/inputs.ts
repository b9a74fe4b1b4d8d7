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

export interface TextSpec extends FieldText {
  maxLength: number;
}

/** What is said once about a point; each of its numbers takes its name from `axes`. */
export interface PointSpec extends FieldText {
  /** Such as fore, out, up. */
  axes: readonly [string, string, string];
  /** "mm" when left out; a bare direction has none. */
  unit?: string;
  min: number;
  max: number;
  step: number;
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
  | (FieldBase & TextSpec & { kind: "text" })
  | (FieldBase & { kind: "point"; axes: readonly InputField[] })
  | (FieldBase & { kind: "group"; fields: readonly InputField[] })
  /** `single`: one value in place of the list counts for all. */
  | (FieldBase & { kind: "list"; item: InputField; single?: true });

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

/** Schema of a few words, such as what is written on a piece. */
export function textInput(spec: TextSpec) {
  return z
    .string({ error: `Give ${spec.label.toLowerCase()} in words.` })
    .max(spec.maxLength, `${spec.label} must be ${spec.maxLength} characters or fewer.`)
    .meta({ kind: "text", ...spec });
}

/** Schema of a point or a direction in space, `[a, b, c]`; messages name the point and the axis. */
export function pointInput({ axes, unit = "mm", min, max, step, ...text }: PointSpec) {
  const axis = (name: string) =>
    numberInput({ label: `${text.label}, ${name}`, help: "", unit, min, max, step, decimals: 1 });
  const [first, second, third] = axes;
  return z
    .tuple([axis(first), axis(second), axis(third)], {
      error: `Give ${text.label.toLowerCase()} as three numbers${unit && ` in ${unit}`}: ${axes.join(", ")}.`,
    })
    .meta(text);
}

/**
 * Lists the fields of an input schema, nested ones included, in the order they are written. A union of one value or a
 * list of them is described as the list: the single value is short for one that counts for all.
 */
export function describeInputs(schema: z.ZodObject): InputField[] {
  return Object.entries(schema.shape).map(([name, field]) => describeField(name, field as z.ZodType));
}

function describeField(name: string, schema: z.ZodType): InputField {
  const { inner: outer, optional, fallback } = unwrap(schema);
  const list = outer instanceof z.ZodUnion && outer.options.find((option) => option instanceof z.ZodArray);
  const inner = list || outer;
  const spec = { ...inner.meta(), ...schema.meta() };
  const base = { name, optional, label: name, help: "", ...spec };
  const field = fallback === undefined ? base : { ...base, default: fallback };
  if (inner instanceof z.ZodObject) return { ...field, kind: "group", fields: describeInputs(inner) };
  if (inner instanceof z.ZodArray) {
    const item = describeField("item", inner.element as z.ZodType);
    return { ...field, kind: "list", item, ...(list && { single: true }) };
  }
  if (inner instanceof z.ZodTuple) {
    const axes = inner.def.items.map((item, index) => describeField(String(index), item as z.ZodType));
    return { ...field, kind: "point", axes };
  }
  if (inner instanceof z.ZodBoolean) return { ...field, kind: "switch" };
  if (spec.kind === "number" || spec.kind === "choice" || spec.kind === "text") return field as InputField;
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
