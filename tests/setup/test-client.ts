import type { Endpoint, EndpointInput, EndpointName, EndpointResponse } from "#shared/contracts/endpoint.ts";
import type { ErrorResponse } from "#shared/contracts/errors.ts";
import type { RawCall } from "#shared/contracts/rendering.ts";

export type TestClient = ReturnType<typeof createTestClient>;

type Refusal = ErrorResponse["error"] & { status: number };

/** A caller over real HTTP that keeps its cookies, as a browser would. */
export function createTestClient(url: string, origin: string) {
  const cookies = new Map<string, string>();

  async function send(path: string, init: RequestInit = {}): Promise<Response> {
    const headers = new Headers(init.headers);
    if (cookies.size > 0) headers.set("Cookie", [...cookies].map((pair) => pair.join("=")).join("; "));
    if (!headers.has("Origin")) headers.set("Origin", origin);
    const response = await fetch(url + path, { redirect: "manual", ...init, headers });
    for (const line of response.headers.getSetCookie()) keep(line);
    return response;
  }

  function keep(line: string): void {
    const [pair = ""] = line.split(";");
    const cut = pair.indexOf("=");
    const [name, value] = [pair.slice(0, cut), pair.slice(cut + 1)];
    if (value === "" || /max-age=0/i.test(line)) cookies.delete(name);
    else cookies.set(name, value);
  }

  function sendJson(method: string, path: string, body?: unknown): Promise<Response> {
    const json =
      body === undefined
        ? {}
        : { body: JSON.stringify(body), headers: { "Content-Type": "application/json" } };
    return send(path, { method, ...json });
  }

  function request(name: string, input: RawCall): Promise<Response> {
    const [method = "GET", path = "/"] = name.split(" ");
    const filled = path.replace(/:(\w+)/g, (_, key: string) =>
      encodeURIComponent(String(input.params?.[key])),
    );
    const query = new URLSearchParams(
      Object.entries(input.query ?? {}).flatMap(([key, value]) =>
        value === undefined ? [] : [[key, String(value)]],
      ),
    );
    return sendJson(method, query.size > 0 ? `${filled}?${query}` : filled, input.body);
  }

  return {
    cookies,
    fetch: send,
    sendJson,
    /** Calls an endpoint that is expected to succeed. */
    async call<E extends Endpoint>(
      name: EndpointName<E>,
      input: EndpointInput<E>,
    ): Promise<EndpointResponse<E>> {
      const response = await request(name, input);
      const body = await response.json();
      if (!response.ok) throw new Error(`${name} answered ${response.status}: ${JSON.stringify(body)}`);
      return body as EndpointResponse<E>;
    },
    /** Calls an endpoint that is expected to refuse, and gives its status and error. */
    async refused<E extends Endpoint>(name: EndpointName<E>, input: EndpointInput<E>): Promise<Refusal> {
      const response = await request(name, input);
      const body = (await response.json()) as ErrorResponse;
      if (response.ok) throw new Error(`${name} succeeded with ${response.status}`);
      return { status: response.status, ...body.error };
    },
    async signIn(email: string, password: string): Promise<Response> {
      const response = await sendJson("POST", "/api/auth/sign-in/email", { email, password });
      if (!response.ok) throw new Error(`Signing in as ${email} answered ${response.status}`);
      return response;
    },
  };
}
