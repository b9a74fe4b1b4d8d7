import { format } from "node:util";
import { afterEach, beforeEach, expect, vi } from "vitest";

/** Warnings and errors on the console fail the test that caused them. */
const noise: string[] = [];

beforeEach(() => {
  noise.length = 0;
  for (const level of ["warn", "error"] as const) {
    vi.spyOn(console, level).mockImplementation((...parts: unknown[]) => {
      noise.push(format(...parts));
    });
  }
});

afterEach(() => {
  expect(noise).toEqual([]);
});
