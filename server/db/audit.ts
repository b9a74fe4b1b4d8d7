import { v7 as uuid } from "uuid";
import type { Connection } from "./client.ts";
import { auditLines } from "./schema/audit.ts";

export interface AuditLine {
  at: number;
  /** Null when the site itself acted, as a job does. */
  actorId: string | null;
  /** The kind of thing and the verb, such as `entry.publish`. */
  action: string;
  subjectKind: "build" | "stage" | "entry" | "photo" | "person";
  subjectId: string;
  /** What someone asking later would want to know; no personal data beyond ids. */
  detail?: Record<string, unknown>;
}

/** Writes who did what to which thing. Pass the transaction of the act, so that both are kept or neither. */
export function recordAudit(connection: Connection, { detail = {}, ...line }: AuditLine): void {
  connection
    .insert(auditLines)
    .values({ ...line, id: uuid(), detail: JSON.stringify(detail) })
    .run();
}
