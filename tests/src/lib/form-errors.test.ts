import { describe, expect, it, vi } from "vitest";
import { ApiError } from "#src/lib/api.ts";
import { messageOf, showErrors } from "#src/lib/form-errors.ts";

describe("showErrors", () => {
  it("puts a server's message beside its field and the focus on the first", () => {
    const setError = vi.fn();
    const error = new ApiError(422, "invalid_input", "No.", { title: "Too long.", status: "Unknown." });
    showErrors<{ title: string; status: string }>(error, setError, ["title", "status"]);
    expect(setError.mock.calls).toEqual([
      ["title", { type: "server", message: "Too long." }, { shouldFocus: true }],
      ["status", { type: "server", message: "Unknown." }, { shouldFocus: false }],
    ]);
  });

  it("says at the form's head what belongs to no field", () => {
    const setError = vi.fn();
    const error = new ApiError(0, "offline", "The server cannot be reached.");
    showErrors<{ title: string }>(error, setError, ["title"]);
    expect(setError.mock.calls).toEqual([
      ["root", { type: "server", message: "The server cannot be reached." }],
    ]);
  });
});

describe("messageOf", () => {
  it("does not show a person what a programming error says", () => {
    expect(messageOf(new TypeError("x is undefined"))).not.toContain("undefined");
  });
});
