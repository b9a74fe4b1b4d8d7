import { z } from "zod";
import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import type { Endpoint } from "#shared/contracts/endpoint.ts";
import { errorResponse } from "#shared/contracts/errors.ts";

interface ApiParts {
  endpoints: readonly Endpoint[];
  calculators: readonly CalculatorDefinition[];
  siteUrl: string;
}

type Json = Record<string, unknown>;

/** The API as an OpenAPI 3.1 document, made from the contracts that the server itself parses by. */
export function describeApi({ endpoints, calculators, siteUrl }: ApiParts): Json {
  const paths: Record<string, Json> = {};
  const add = (path: string, method: string, operation: Json) => {
    paths[path] = { ...paths[path], [method]: operation };
  };
  for (const endpoint of endpoints) {
    add(openPath(endpoint.path), endpoint.method.toLowerCase(), describeEndpoint(endpoint));
  }
  for (const calculator of calculators) {
    add(`/api/calculators/${calculator.id}`, "post", describeCalculator(calculator));
  }
  return {
    openapi: "3.1.0",
    info: {
      title: "Soapstone",
      version: "1",
      description:
        "The API that the site itself uses. Lengths are mm, angles degrees. Signed-in calls go by the session cookie.",
    },
    servers: [{ url: siteUrl }],
    paths,
    components: {
      securitySchemes: { session: { type: "apiKey", in: "cookie", name: "better-auth.session_token" } },
    },
  };
}

/** `/api/builds/:build` as OpenAPI writes it. */
const openPath = (path: string) => path.replaceAll(/:(\w+)/g, "{$1}");

const accessWords: Record<Endpoint["access"], string> = {
  anyone: "Open to anyone.",
  signed_in: "For signed-in people.",
  verified: "For signed-in people whose address is confirmed.",
  moderator: "For moderators.",
  administrator: "For administrators.",
};

function describeEndpoint({
  method,
  path,
  access,
  summary,
  params,
  query,
  body,
  response,
  status,
}: Endpoint): Json {
  const parameters = [...describeParameters(params, "path"), ...describeParameters(query, "query")];
  return {
    operationId: `${method.toLowerCase()}${path.replaceAll(/[^a-z]+(\w)/gi, (_, letter) => letter.toUpperCase())}`,
    summary,
    description: accessWords[access],
    ...(access !== "anyone" && { security: [{ session: [] }] }),
    ...(parameters.length > 0 && { parameters }),
    ...(body && { requestBody: jsonBody(body, "input") }),
    responses: answers(status ?? 200, jsonBody(response, "output")),
  };
}

function describeParameters(schema: z.ZodObject | undefined, place: "path" | "query"): Json[] {
  if (!schema) return [];
  const { properties = {}, required = [] } = jsonSchema(schema, "input") as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, each]) => ({
    name,
    in: place,
    required: place === "path" || required.includes(name),
    schema: each,
  }));
}

function describeCalculator({
  id,
  name,
  purpose,
  inputs,
  resultFields,
  example,
}: CalculatorDefinition): Json {
  const properties: Record<string, Json> = {};
  for (const { name: path, label, unit, meaning } of resultFields) {
    const [first = path, ...rest] = path.split(".");
    const leaf = { type: "number", title: label, description: `${meaning} ${unit && `In ${unit}.`}`.trim() };
    if (rest.length === 0) properties[first] = leaf;
    else {
      const before = properties[first]?.properties as Json | undefined;
      properties[first] = { type: "object", properties: { ...before, [rest.join(".")]: leaf } };
    }
  }
  return {
    operationId: `work-${id}`,
    summary: name,
    description: `${purpose} ${accessWords.anyone}`,
    tags: ["calculators"],
    requestBody: { content: { "application/json": { schema: jsonSchema(inputs, "input"), example } } },
    responses: answers(200, { content: { "application/json": { schema: { type: "object", properties } } } }),
  };
}

function answers(status: number, success: Json): Json {
  return {
    [status]: { description: "Done.", ...(status !== 204 && success) },
    default: { description: "Refused; `error` says why.", ...jsonBody(errorResponse, "output") },
  };
}

function jsonBody(schema: z.ZodType, io: "input" | "output"): Json {
  return { content: { "application/json": { schema: jsonSchema(schema, io) } } };
}

/** What a calculator's inputs say of themselves, in the words that JSON Schema has for it. */
function jsonSchema(schema: z.ZodType, io: "input" | "output"): Json {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, {
    io,
    unrepresentable: "any",
    override({ jsonSchema: made }) {
      const { label, help, unit, kind, choices, step, decimals, minor, axes, min, max, ...kept } =
        made as Json;
      if (label === undefined) return;
      for (const name of Object.keys(made)) delete (made as Json)[name];
      const said = [help, unit ? `In ${unit}.` : ""].filter(Boolean).join(" ");
      Object.assign(made, kept, { title: label, ...(said && { description: said }) });
    },
  });
  return rest;
}
