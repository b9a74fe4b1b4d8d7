import type { InputField } from "./inputs.ts";

/**
 * Inputs as words of an address: one pair for each number, choice or word, under its dotted name (`ends.0.angle`).
 * What is left out or undefined gives no pair.
 */
export function inputsToAddress(inputs: unknown, within = ""): [string, string][] {
  if (inputs === undefined || inputs === null) return [];
  if (typeof inputs !== "object") return [[within, String(inputs)]];
  return Object.entries(inputs).flatMap(([name, value]) =>
    inputsToAddress(value, within === "" ? name : `${within}.${name}`),
  );
}

/**
 * Inputs out of an address, raw: the calculator's schema has yet to judge them. Words stand where a number was
 * wanted and none could be read, so that the schema's own message tells of it.
 *
 * @param fields of the calculator: they say what is a number and what a word
 */
export function inputsFromAddress(
  fields: readonly InputField[],
  pairs: Iterable<readonly [string, unknown]>,
): Record<string, unknown> {
  const root: Branch = {};
  for (const [path, text] of pairs) put(root, path.split("."), readLeaf(fieldAt(fields, path), text));
  return Object.fromEntries(Object.entries(root).map(([name, value]) => [name, asGiven(value)]));
}

interface Branch {
  [name: string]: unknown;
}

const isBranch = (value: unknown): value is Branch => typeof value === "object" && value !== null;

function put(at: Branch, [name = "", ...rest]: string[], value: unknown): void {
  // An address is anyone's to write: a name such as __proto__ must be a name like any other.
  const own = Object.hasOwn(at, name) ? at[name] : undefined;
  if (rest.length === 0) {
    // The length of a list or the switch of a group, sent by a form: the parts themselves say it better.
    if (!isBranch(own)) define(at, name, value);
    return;
  }
  const branch = isBranch(own) ? own : {};
  if (branch !== own) define(at, name, branch);
  put(branch, rest, value);
}

function define(at: Branch, name: string, value: unknown): void {
  Object.defineProperty(at, name, { value, enumerable: true, configurable: true, writable: true });
}

function asGiven(value: unknown): unknown {
  if (!isBranch(value)) return value;
  const entries = Object.entries(value).map(([name, part]) => [name, asGiven(part)] as const);
  const isList = entries.length > 0 && entries.every(([name]) => /^\d{1,4}$/.test(name));
  if (!isList) return Object.fromEntries(entries);
  return entries.toSorted(([a], [b]) => Number(a) - Number(b)).map(([, part]) => part);
}

function fieldAt(fields: readonly InputField[], path: string): InputField | undefined {
  const [name, ...rest] = path.split(".");
  let field = fields.find((each) => each.name === name);
  for (const step of rest) {
    if (field?.kind === "list") field = field.item;
    else if (field?.kind === "point") field = field.axes[Number(step)];
    else if (field?.kind === "group") field = field.fields.find((each) => each.name === step);
    else return undefined;
  }
  return field;
}

function readLeaf(field: InputField | undefined, text: unknown): unknown {
  if (typeof text !== "string") return text;
  if (field?.kind === "switch") return text === "true" ? true : text === "false" ? false : text;
  if (field?.kind === "text" || field?.kind === "choice") return text;
  const number = text.trim() === "" ? Number.NaN : Number(text);
  return Number.isNaN(number) ? text : number;
}
