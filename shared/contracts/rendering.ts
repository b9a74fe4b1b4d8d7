/**
 * How the server has a page drawn by the client's code. Types only: neither side imports the other.
 */

/** What the server knows of how and where a page is shown. */
export interface PageSettings {
  /** The address of the site without a slash at the end, for canonical and feed links. */
  siteUrl: string;
  /** The colour scheme the person chose; `system` follows the device. */
  scheme: "light" | "dark" | "system";
  /** The units a signed-out person chose; a signed-in person's own preference goes first. */
  units: "mm" | "inch";
  /** True while the mail fake and other stand-ins run inside the server. */
  fakes: boolean;
}

/** What goes out with a call of an endpoint. */
export interface RawCall {
  params?: Record<string, unknown>;
  query?: Record<string, unknown>;
  body?: unknown;
}

/**
 * Carries a call to its route, by HTTP or within the process; `name` is an endpoint's name. A refusal is
 * an answer too: status 400 and over with an `ErrorResponse` as its body.
 */
export type Transport = (name: string, call: RawCall) => Promise<{ status: number; body: unknown }>;

/** A page as HTML in pieces, or where to go instead. */
export type RenderedPage =
  | { kind: "redirect"; status: number; location: string }
  | {
      kind: "page";
      status: number;
      /** Elements for the head: title, meta, canonical link. */
      head: string;
      body: string;
      /** Handed to the browser as JSON. */
      state: unknown;
      /** Source files of the pages drawn, to preload what they were built into. */
      modules: string[];
    };

/** What `src/entry-server.tsx` exports. */
export interface PageRenderer {
  render(request: Request, transport: Transport, settings: PageSettings): Promise<RenderedPage>;
}
