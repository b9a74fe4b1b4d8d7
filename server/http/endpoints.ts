import express, { type Request, type RequestHandler, Router } from "express";
import type { z } from "zod";
import type {
  Endpoint,
  EndpointAnswer,
  EndpointName,
  EndpointRequest,
  EndpointResponse,
} from "#shared/contracts/endpoint.ts";
import { invalidInput } from "./errors.ts";
import { admit } from "./policy.ts";
import type { Viewer } from "./viewer.ts";

/** What a handler gets beside the parsed request. `http` is null when the page renderer calls. */
export interface CallContext {
  viewer: Viewer;
  http: Request | null;
}

type Handler<E extends Endpoint> = (
  request: EndpointRequest<E>,
  context: CallContext,
) => EndpointAnswer<E> | Promise<EndpointAnswer<E>>;

/** An endpoint with the function that answers it. Routes parse, delegate and shape; rules live in services. */
export interface Route {
  endpoint: Endpoint;
  /** Runs before the handler on the HTTP side only: uploads and rate limits. */
  before: RequestHandler[];
  answer(raw: RawInput, context: CallContext): Promise<unknown>;
}

export interface RawInput {
  params?: unknown;
  query?: unknown;
  body?: unknown;
}

/** Binds an endpoint to its handler. */
export function route<E extends Endpoint>(
  endpoint: E,
  handler: Handler<E>,
  ...before: RequestHandler[]
): Route {
  return {
    endpoint,
    before,
    async answer(raw, context) {
      admit(endpoint.access, context.viewer);
      const request = {
        ...(endpoint.params && { params: parseInput(endpoint.params, raw.params ?? {}) }),
        ...(endpoint.query && { query: parseInput(endpoint.query, raw.query ?? {}) }),
        ...(endpoint.body && { body: parseInput(endpoint.body, raw.body ?? {}) }),
      };
      // The shape above follows the endpoint's own schemas, which the type cannot express.
      const answer = await handler(request as EndpointRequest<E>, context);
      return endpoint.response.parse(answer) as EndpointResponse<E>;
    },
  };
}

function parseInput(schema: z.ZodType, value: unknown): unknown {
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw invalidInput(parsed.error);
  return parsed.data;
}

export function endpointName(endpoint: Endpoint): EndpointName<Endpoint> {
  return `${endpoint.method} ${endpoint.path}`;
}

/** Calls routes by name without HTTP: how a page is rendered on the server. */
export type InProcessCall = (name: string, input: RawInput, context: CallContext) => Promise<unknown>;

export function inProcessCaller(routes: Route[]): InProcessCall {
  const byName = new Map(routes.map((each) => [endpointName(each.endpoint) as string, each]));
  return async (name, input, context) => {
    const found = byName.get(name);
    if (!found) throw new Error(`No route is called ${name}`);
    return found.answer(input, context);
  };
}

/** Serves routes over HTTP. Two routes of one name are a mistake in the wiring and stop the start. */
export function apiRouter(routes: Route[]): Router {
  const router = Router();
  const seen = new Set<string>();
  for (const each of routes) {
    const name = endpointName(each.endpoint);
    if (seen.has(name)) throw new Error(`Two routes are called ${name}`);
    seen.add(name);
    const method = each.endpoint.method.toLowerCase() as "get" | "post" | "put" | "patch" | "delete";
    router[method](
      each.endpoint.path,
      guard(each),
      express.json({ limit: "2mb" }),
      ...each.before,
      respond(each),
    );
  }
  return router;
}

/** Turns strangers away before their body is read. */
function guard({ endpoint }: Route): RequestHandler {
  return (req, _res, next) => {
    admit(endpoint.access, req.viewer);
    next();
  };
}

function respond({ endpoint, answer }: Route): RequestHandler {
  return async (req, res) => {
    const input = { params: req.params, query: req.query, body: req.body };
    const body = await answer(input, { viewer: req.viewer, http: req });
    res.set("Cache-Control", "no-store");
    res.status(endpoint.status ?? 200).json(body);
  };
}
