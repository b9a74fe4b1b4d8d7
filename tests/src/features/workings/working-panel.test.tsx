import { XMLParser } from "fast-xml-parser";
import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { runCalculator } from "#shared/calculators/registry.ts";
import { WorkingPanel } from "#src/features/workings/components/working-panel.tsx";

function render(inputs: Record<string, unknown>, units: "mm" | "inch" = "mm", changes: object = {}) {
  const run = runCalculator("saddle-cope", inputs);
  if (!run.ok) throw new Error(run.issue.message);
  const working = {
    id: "w",
    number: 12,
    title: "Lower front cope",
    ...run.value,
    results: { ...run.value.results },
    ...changes,
  };
  return renderToStaticMarkup(
    <WorkingPanel working={working} mode="read" units={units} apiBase="/api/workings/w" />,
  );
}

const inputs = { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60, offset: 2 };

/** Words a reader sees, without the marks. */
const wordsOf = (html: string) => html.replace(/<[^>]+>/g, " ").replace(/\s+/g, " ");

describe("WorkingPanel, drawn on the server", () => {
  it("is complete without JavaScript: drawing, results, steps, cautions, method and template links", () => {
    const html = render(inputs);
    const words = wordsOf(html);
    expect(html.match(/<svg[^>]*role="img"/g)).toHaveLength(3);
    for (const part of [
      "W12",
      "Lower front cope",
      "Deepest cut",
      "29.3 mm",
      "Hole-saw set-up",
      "Mark it by hand",
      "How this is worked out",
      "Clamp the tube",
    ]) {
      expect(words).toContain(part);
    }
    for (const link of ["pdf?paper=a4", "pdf?paper=letter", "svg", "dxf"]) {
      expect(html).toContain(`href="/api/workings/w/template/${link}"`);
    }
  });

  it("shows lengths in inches to a person who works in them", () => {
    const words = wordsOf(render(inputs, "inch"));
    expect(words).toContain("1.155 in");
    expect(words).toContain("heel 1.152 in");
  });

  it("tells the drawing in words to those who do not see it", () => {
    expect(render(inputs)).toContain(
      'aria-label="The joint from the side: a branch meets the header at 60 degrees.',
    );
  });

  it.each([
    { ...inputs, angle: 15, offset: 0 },
    { ...inputs, branchOd: 44.5, angle: 90, offset: 0 },
    { headerOd: 400, branchOd: 20, branchWall: 1, angle: 30, offset: -190 },
    { headerOd: 400, branchOd: 20, branchWall: 1, angle: 90, offset: 190 },
    { headerOd: 2000, branchOd: 3, branchWall: 0.2, angle: 90, offset: 0 },
  ])("draws %o without a number that is none", (setting) => {
    const html = render(setting);
    expect(html).not.toMatch(/NaN|Infinity|undefined/);
    const svgs = [...html.matchAll(/<svg[^>]*role="img".*?<\/svg>/gs)].map(([svg]) => svg);
    for (const svg of svgs) expect(() => new XMLParser().parse(svg, true)).not.toThrow();
  });

  it("shows both answers when an earlier version of the sum gave another", () => {
    const run = runCalculator("saddle-cope", inputs);
    const results = run.ok ? { ...run.value.results, deepest: 20 } : {};
    const words = wordsOf(render(inputs, "mm", { version: 0, results }));
    expect(words).toContain("worked by version 0 of the sum. Version 1 gives another answer.");
    expect(words).toContain("Deepest cut, mm 20.0 29.3 +9.3");
  });

  it("says nothing of versions while the answers agree", () => {
    expect(wordsOf(render(inputs, "mm", { version: 0 }))).not.toContain("another answer");
  });

  it("says so when the calculator is no longer here", () => {
    expect(wordsOf(render(inputs, "mm", { calculator: "gone" }))).toContain("no longer here");
  });
});
