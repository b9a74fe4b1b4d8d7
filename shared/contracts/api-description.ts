import { z } from "zod";
import { endpoint } from "./endpoint.ts";

/** The API's own description, an OpenAPI 3.1 document. */
export const getApiDescription = endpoint({
  method: "GET",
  path: "/api/openapi.json",
  access: "anyone",
  summary: "Describe this API",
  response: z.record(z.string(), z.unknown()),
});
