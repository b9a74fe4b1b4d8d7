import { z } from "zod";
import { endpoint } from "./endpoint.ts";

/** An id as it stands in an address; whether there is such a calculator is the service's to say. */
const calculatorId = z
  .string()
  .regex(/^[a-z0-9-]{1,60}$/, "A calculator's id is small letters, digits and hyphens.");

/**
 * Works a sum. Takes and gives the same JSON as `npm run -s calc`; bad input answers 422 with the field
 * and the message in `error`.
 */
export const workSum = endpoint({
  method: "POST",
  path: "/api/calculators/:calculator",
  access: "anyone",
  summary: "Work a sum: inputs in, results out",
  params: z.object({ calculator: calculatorId }),
  body: z.unknown(),
  response: z.record(z.string(), z.unknown()),
});

/** Every calculator, in the order of the bench. */
export const listCalculators = endpoint({
  method: "GET",
  path: "/api/calculators",
  access: "anyone",
  summary: "List the calculators",
  response: z.object({
    items: z.array(
      z.object({
        id: z.string(),
        version: z.number(),
        name: z.string(),
        purpose: z.string(),
        group: z.string(),
        words: z.array(z.string()),
      }),
    ),
  }),
});
