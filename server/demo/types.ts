import type { BuildStatus, StageState } from "#shared/contracts/builds.ts";
import type { DocumentNode } from "#shared/document/types.ts";
import type { PhotoName } from "./photos.ts";

export interface DemoPerson {
  key: string;
  name: string;
  email: string;
  /** A fixed string, printed at the start and shown on the sign-in page while the demo is loaded. */
  password: string;
  role: "reader" | "moderator" | "administrator";
  /** What they are, for the list of sign-ins. */
  what: string;
  bio: string;
  units: "mm" | "inch";
  avatar: PhotoName | null;
  since: string;
}

/**
 * A figure that stands in the prose, tied to what it came from: a working's result, or a sum that any reader
 * could do. A test holds them together, to the decimals written.
 */
export type QuotedFigure = { text: string } & ({ working: string; result: string } | { sum: () => number });

export interface DemoEntry {
  slug: string;
  title: string;
  summary: string;
  stage: string;
  /** When it was written and, unless it is a draft or scheduled, published. */
  at: string;
  /** `scheduledInDays` counts from the moment of loading, so that one entry is always still to come. */
  state: "public" | "draft" | { scheduledInDays: number };
  content: readonly DocumentNode[];
  quoted: readonly QuotedFigure[];
}

export interface DemoBuild {
  slug: string;
  title: string;
  purpose: string;
  status: BuildStatus;
  owner: string;
  cover: PhotoName;
  startedAt: string;
  stages: readonly { title: string; state: StageState }[];
  /** In the order they were written. */
  entries: readonly DemoEntry[];
}
