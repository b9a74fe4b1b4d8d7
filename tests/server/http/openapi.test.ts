import { afterAll, describe, expect, it } from "vitest";
import { calculators } from "#shared/calculators/registry.ts";
import { createTestApp } from "#tests/setup/test-app.ts";

const t = await createTestApp();
afterAll(() => t.close());

interface Described {
  openapi: string;
  paths: Record<string, Record<string, { requestBody?: unknown; responses: Record<string, unknown> }>>;
}

const description: Described = await (await t.anyone.fetch("/api/openapi.json")).json();

describe("GET /api/openapi.json", () => {
  it("is OpenAPI 3.1 and lists each route with its parameters in braces", () => {
    expect(description.openapi).toBe("3.1.0");
    expect(description.paths["/api/builds/{build}"]).toHaveProperty("get");
    expect(description.paths["/api/openapi.json"]).toHaveProperty("get");
    expect(Object.keys(description.paths).filter((path) => path.includes(":"))).toEqual([]);
  });

  it.each(calculators.map(({ id }) => id))("describes the inputs of %s with unit and limits", (id) => {
    expect(description.paths[`/api/calculators/${id}`]?.post?.requestBody).toMatchObject({
      content: { "application/json": { schema: { type: "object", properties: expect.any(Object) } } },
    });
  });

  it("says a number's label, unit and limits in JSON Schema's own words", () => {
    expect(description.paths["/api/calculators/saddle-cope"]?.post?.requestBody).toMatchObject({
      content: {
        "application/json": {
          schema: {
            properties: {
              angle: {
                type: "number",
                minimum: 15,
                maximum: 90,
                title: "Angle between the axes",
                description: "90 is square. In °.",
              },
            },
          },
        },
      },
    });
  });

  it("tells that every route can refuse, and how", () => {
    for (const methods of Object.values(description.paths)) {
      for (const operation of Object.values(methods)) expect(operation.responses).toHaveProperty("default");
    }
  });
});
