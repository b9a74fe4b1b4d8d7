interface Answer {
  status: number;
  body: unknown;
  headers: Headers;
}

/** As much of a browser as a session needs: cookies kept, Origin sent. */
export class Browser {
  readonly cookies = new Map<string, string>();
  constructor(
    private readonly address: string,
    private readonly origin: string,
  ) {}

  get = (path: string, headers: Record<string, string> = {}) => this.send("GET", path, undefined, headers);
  post = (path: string, body: unknown, headers: Record<string, string> = {}) =>
    this.send("POST", path, body, headers);

  async send(
    method: string,
    path: string,
    body?: unknown,
    headers: Record<string, string> = {},
  ): Promise<Answer> {
    const cookie = [...this.cookies].map(([name, value]) => `${name}=${value}`).join("; ");
    const response = await fetch(this.address + path, {
      method,
      redirect: "manual",
      headers: {
        origin: this.origin,
        ...(cookie && { cookie }),
        ...(body !== undefined && { "content-type": "application/json" }),
        ...headers,
      },
      ...(body !== undefined && { body: JSON.stringify(body) }),
    });
    for (const set of response.headers.getSetCookie()) this.keep(set);
    const text = await response.text();
    return { status: response.status, headers: response.headers, body: parsed(text) };
  }

  /** The person this browser is signed in as, as the API tells it. */
  async me() {
    const { body } = await this.get("/api/me");
    return (body as { me: Record<string, unknown> | null }).me;
  }

  private keep(set: string): void {
    const [pair = ""] = set.split(";");
    const [name = "", value = ""] = pair.split("=");
    if (/max-age=0/i.test(set)) this.cookies.delete(name);
    else this.cookies.set(name, value);
  }
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return text;
  }
}
