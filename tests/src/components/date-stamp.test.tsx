import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { DateStamp } from "#src/components/date-stamp.tsx";

const now = Date.UTC(2026, 5, 1, 9);
const day = 86_400_000;

/** The words without tags. */
const words = (at: number, withNow = true) =>
  renderToStaticMarkup(<DateStamp at={at} {...(withNow && { now })} />).replaceAll(/<[^>]+>/g, "");

describe("DateStamp", () => {
  it.each([
    [now - 30_000, "1 June 2026 · just now"],
    [now - 3 * 3_600_000, "1 June 2026 · 3 hours ago"],
    [now - day, "31 May 2026 · yesterday"],
    [now - 10 * day, "22 May 2026 · last week"],
    [now - 70 * day, "23 March 2026 · 2 months ago"],
    [now + 2 * day, "3 June 2026 · in 2 days"],
  ])("says when and how far off: %i", (at, expected) => {
    expect(words(at)).toBe(expected);
  });

  it("says the date alone where the present is not known", () => {
    expect(words(now - day, false)).toBe("31 May 2026");
  });

  it("gives machines the moment in ISO 8601, whatever the reader's time zone", () => {
    expect(renderToStaticMarkup(<DateStamp at={now} />)).toContain('dateTime="2026-06-01T09:00:00.000Z"');
  });
});
