import { createContext, useContext } from "react";
import type { Endpoint, EndpointInput, EndpointName, EndpointResponse } from "#shared/contracts/endpoint.ts";
import type { ErrorResponse } from "#shared/contracts/errors.ts";
import type { RawCall, Transport } from "#shared/contracts/rendering.ts";

/**
 * Calls the API by the contract's own types: `api.call<typeof getBuild>("GET /api/builds/:build",
 * { params: { build } })`. Contracts are imported as types only, so that their schemas stay out of a
 * reader's first load.
 */
export interface Api {
  call<E extends Endpoint>(name: EndpointName<E>, input: EndpointInput<E>): Promise<EndpointResponse<E>>;
}

/** A refusal by the server, with its message for the person and for each field. */
export class ApiError extends Error {
  override name = "ApiError";
  constructor(
    readonly status: number,
    readonly code: ErrorResponse["error"]["code"] | "offline",
    message: string,
    readonly fields: Record<string, string> = {},
    readonly id?: string,
  ) {
    super(message);
  }
}

export function createApi(transport: Transport): Api {
  return {
    async call<E extends Endpoint>(name: EndpointName<E>, input: EndpointInput<E>) {
      const { status, body } = await transport(name, input);
      if (status >= 400) throw apiErrorFrom(status, body);
      return body as EndpointResponse<E>;
    },
  };
}

/** Fills `:names` in a path and appends the query. */
export function urlOf(path: string, call: RawCall): string {
  const filled = path.replace(/:(\w+)/g, (_, key: string) => encodeURIComponent(String(call.params?.[key])));
  const query = new URLSearchParams();
  for (const [key, value] of Object.entries(call.query ?? {})) {
    if (value !== undefined) query.set(key, String(value));
  }
  return query.size > 0 ? `${filled}?${query}` : filled;
}

/** The transport of the browser. */
export const fetchTransport: Transport = async (name, call) => {
  const [method = "GET", path = "/"] = name.split(" ");
  const hasBody = call.body !== undefined;
  const response = await send(urlOf(path, call), {
    method,
    ...(hasBody && { body: JSON.stringify(call.body), headers: { "Content-Type": "application/json" } }),
  });
  return { status: response.status, body: await response.json().catch(() => null) };
};

async function send(url: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(url, init);
  } catch {
    throw new ApiError(0, "offline", "The server cannot be reached. Check the connection and try again.");
  }
}

/** The error that a refused request carries; for callers that cannot go through `Api`, such as uploads. */
export function apiErrorFrom(status: number, body: unknown): ApiError {
  const error = (body as Partial<ErrorResponse> | null)?.error;
  if (!error) return new ApiError(status, "internal", "The server gave an answer that could not be read.");
  return new ApiError(status, error.code, error.message, error.fields, error.id);
}

const ApiContext = createContext<Api | null>(null);

export const ApiProvider = ApiContext.Provider;

export function useApi(): Api {
  const api = useContext(ApiContext);
  if (!api) throw new Error("useApi is used outside ApiProvider");
  return api;
}
