import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { nextPath } from "#src/features/accounts/next-path.ts";

describe("nextPath", () => {
  it.each(["/workshop", "/builds/heron?from=1#w12", "/"])("keeps %s", (path) => {
    expect(nextPath(path, "/otherwise")).toBe(path);
  });

  it.each([
    null,
    "",
    "workshop",
    "https://evil.example/",
    "//evil.example",
    "///evil.example",
    "/\\evil.example",
    "/\t/evil.example",
    "/.//evil.example",
    "javascript:alert(1)",
  ])("does not follow %j", (path) => {
    expect(nextPath(path, "/otherwise")).toBe("/otherwise");
  });

  it("never leads a browser off the site", () => {
    const unit = fc.constantFrom("/", "\\", ".", "@", ":", "?", "#", "%2f", "\t", "e", "x");
    const rough = fc.string({ unit });
    fc.assert(
      fc.property(rough, (text) => {
        const led = new URL(nextPath(`/${text}`, "/"), "https://own.example/sign-in");
        expect(led.origin).toBe("https://own.example");
      }),
    );
  });
});
