import { Disclosure } from "#src/components/disclosure.tsx";

interface Schema {
  type?: string | string[];
  title?: string;
  description?: string;
  enum?: unknown[];
  minimum?: number;
  maximum?: number;
  maxLength?: number;
  items?: Schema;
  properties?: Record<string, Schema>;
  required?: string[];
  anyOf?: Schema[];
}

type Content = { content?: { "application/json"?: { schema: Schema; example?: unknown } } };

/** One operation of the OpenAPI document, as far as it is shown. */
export interface Operation {
  summary: string;
  description: string;
  tags?: string[];
  parameters?: { name: string; in: string; required: boolean; schema: Schema }[];
  requestBody?: Content;
  responses: Record<string, Content>;
}

interface ApiOperationProps {
  path: string;
  method: string;
  operation: Operation;
}

/** What an address takes and gives, folded until it is wanted. */
export function ApiOperation({ path, method, operation }: ApiOperationProps) {
  const { summary, description, parameters = [], requestBody, responses } = operation;
  const taken = requestBody?.content?.["application/json"];
  const given = Object.entries(responses).find(([status]) => status.startsWith("2"))?.[1];
  return (
    <Disclosure
      summary={
        <span className="flex min-w-0 flex-wrap items-baseline gap-x-3">
          <code className="figures text-xs break-all">
            {method.toUpperCase()} {path}
          </code>
          <span className="text-xs font-normal text-ink-soft">{summary}</span>
        </span>
      }
    >
      <div className="flex flex-col gap-4 text-sm">
        <p>{description}</p>
        {parameters.length > 0 ? (
          <SchemaList
            caption="In the address"
            rows={parameters.map(({ name, required, schema }) => ({ name, required, schema }))}
          />
        ) : null}
        {taken ? <SchemaList caption="Takes" rows={rowsOf(taken.schema)} /> : null}
        {taken?.example ? (
          <pre className="text-xs break-words whitespace-pre-wrap">
            {JSON.stringify(taken.example, null, 2)}
          </pre>
        ) : null}
        <SchemaList caption="Gives" rows={rowsOf(given?.content?.["application/json"]?.schema)} />
      </div>
    </Disclosure>
  );
}

interface Row {
  name: string;
  required: boolean;
  schema: Schema;
}

function rowsOf(schema: Schema | undefined, within = "", depth = 0): Row[] {
  const { properties = {}, required = [] } = schema ?? {};
  return Object.entries(properties).flatMap(([key, each]): Row[] => {
    const name = within + key;
    const inner =
      depth < 2
        ? [...rowsOf(each, `${name}.`, depth + 1), ...rowsOf(each.items, `${name}[].`, depth + 1)]
        : [];
    return [{ name, required: required.includes(key), schema: each }, ...inner];
  });
}

/** A list and not a table: on a phone the long names would push the meaning off the screen. */
function SchemaList({ caption, rows }: { caption: string; rows: Row[] }) {
  if (rows.length === 0) return null;
  return (
    <div>
      <h3 className="mb-1 text-sm font-semibold">{caption}</h3>
      <dl>
        {rows.map(({ name, required, schema }) => (
          <div
            key={name}
            className="grid gap-x-4 border-t border-hairline py-1.5 text-xs md:grid-cols-[minmax(0,2fr)_minmax(0,3fr)]"
          >
            <dt className="figures break-all">{name}</dt>
            <dd className="min-w-0 break-words">
              <span className="text-ink-soft">{`${kindOf(schema)}${required ? "" : ", optional"}. `}</span>
              {meaningOf(schema)}
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}

function kindOf({ type, enum: values, anyOf, items }: Schema): string {
  if (values) return values.map(String).join(" | ");
  if (anyOf) return [...new Set(anyOf.map(kindOf))].join(" or ");
  if (type === "array") return items?.type ? `list of ${kindOf(items)}` : "list";
  return [type ?? "anything"].flat().join(" or ");
}

function meaningOf({ title, description, minimum, maximum, maxLength }: Schema): string {
  const limits = [
    minimum !== undefined && minimum > Number.MIN_SAFE_INTEGER && `at least ${minimum}`,
    maximum !== undefined && maximum < Number.MAX_SAFE_INTEGER && `at most ${maximum}`,
    maxLength !== undefined && `at most ${maxLength} characters`,
  ].filter(Boolean);
  const words = [title && `${title}.`, description, limits.length > 0 && `${limits.join(", ")}.`];
  return words.filter(Boolean).join(" ");
}
