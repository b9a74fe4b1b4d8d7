import type { z } from "zod";

/**
 * Who may call a route at all. Whether this person may act on this very thing (their own build, say)
 * is decided in the service, which answers `not_found` for what the caller may not know of.
 */
export type Access = "anyone" | "signed_in" | "verified" | "moderator" | "administrator";

export type Method = "GET" | "POST" | "PUT" | "PATCH" | "DELETE";

/**
 * One route of the API: the single description from which the server's parsing, the client's types,
 * the policy table and the OpenAPI document all come.
 *
 * `path` is in Express form (`/api/builds/:build`); `status` is the status of success, 200 unless told.
 */
export interface Endpoint {
  method: Method;
  path: `/${string}`;
  access: Access;
  summary: string;
  params?: z.ZodObject;
  query?: z.ZodObject;
  body?: z.ZodType;
  response: z.ZodType;
  status?: 200 | 201 | 202 | 204;
}

/** Declares an endpoint, keeping its literal types. */
export function endpoint<const E extends Endpoint>(description: E): E {
  return description;
}

/** The name under which an endpoint is called and listed, such as `GET /api/me`. */
export type EndpointName<E extends Endpoint> = `${E["method"]} ${E["path"]}`;

type Part<E, Key extends string, Side extends "input" | "output"> = E extends {
  [K in Key]: infer S extends z.ZodType;
}
  ? { [K in Key]: Side extends "input" ? z.input<S> : z.output<S> }
  : object;

/** What a caller sends: those of params, query and body that the endpoint declares. */
export type EndpointInput<E extends Endpoint> = Part<E, "params", "input"> &
  Part<E, "query", "input"> &
  Part<E, "body", "input">;

/** What a handler receives once the contract has parsed the request. */
export type EndpointRequest<E extends Endpoint> = Part<E, "params", "output"> &
  Part<E, "query", "output"> &
  Part<E, "body", "output">;

/** What a handler returns, before the contract shapes it. */
export type EndpointAnswer<E extends Endpoint> = z.input<E["response"]>;

/** What a caller receives. */
export type EndpointResponse<E extends Endpoint> = z.output<E["response"]>;
