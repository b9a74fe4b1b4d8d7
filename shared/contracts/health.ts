import { z } from "zod";
import { endpoint } from "./endpoint.ts";

/** For whoever watches the process: it answers, and how much background work waits. */
export const getHealth = endpoint({
  method: "GET",
  path: "/api/health",
  access: "anyone",
  summary: "Whether the site answers, and how many jobs are due",
  response: z.object({ ok: z.literal(true), dueJobs: z.int() }),
});
