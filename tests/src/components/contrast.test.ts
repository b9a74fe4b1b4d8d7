import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/*
 * WCAG 2.2: 1.4.3 (text, 4.5:1) and 1.4.11 (graphics and controls, 3:1). Relative luminance and contrast ratio as
 * defined in the recommendation's glossary.
 */

const css = (name: string) =>
  readFileSync(new URL(`../../../src/styles/${name}.css`, import.meta.url), "utf8");

function colours(block: string): Map<string, string> {
  const found = new Map<string, string>();
  for (const [, name, hex] of block.matchAll(/--color-([a-z-]+):\s*(#[0-9a-f]{6});/g)) {
    if (name && hex) found.set(name, hex);
  }
  return found;
}

function between(text: string, start: string): string {
  const from = text.indexOf(start);
  if (from < 0) throw new Error(`"${start}" is not in the style sheet`);
  return text.slice(from, text.indexOf("}", from));
}

const tokens = css("tokens");
const light = colours(between(tokens, "@theme static"));
const darkOnly = colours(between(tokens, "@variant dark-surface"));
const dark = new Map([...light, ...darkOnly]);
const plate = new Map([...dark, ...colours(between(css("plate"), ".plate {"))]);
for (const [role, ground] of Object.entries({
  paper: "plate",
  "paper-raised": "plate-raised",
  ink: "chalk",
  "ink-soft": "chalk-soft",
})) {
  plate.set(role, dark.get(ground) ?? "");
}

function luminance(hex: string): number {
  const channel = (start: number) => {
    const value = Number.parseInt(hex.slice(start, start + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

function contrast(one: string, other: string): number {
  const [low = 0, high = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (high + 0.05) / (low + 0.05);
}

const meanings = ["straw", "bronze", "purple", "temper", "grey", "signal"];

const textPairs: [string, string][] = [
  ...["paper", "paper-raised"].flatMap((ground): [string, string][] =>
    ["ink", "ink-soft", ...meanings].map((text) => [text, ground]),
  ),
  ...meanings.flatMap((meaning): [string, string][] => [
    [meaning, `${meaning}-wash`],
    ["ink", `${meaning}-wash`],
    ["ink-soft", `${meaning}-wash`],
  ]),
  ...["bronze", "purple", "temper", "grey", "signal"].map((meaning): [string, string] => [
    `on-${meaning}`,
    meaning,
  ]),
  ["on-temper", "temper-deep"],
  ["on-signal", "signal-deep"],
  ["on-straw", "straw-fill"],
  ["chalk", "plate"],
  ["chalk", "plate-raised"],
  ["chalk-soft", "plate"],
  ["chalk-soft", "plate-raised"],
  ["engraved", "steel"],
  ["engraved", "steel-high"],
];

const graphicPairs: [string, string][] = [
  ["edge", "paper"],
  ["edge", "paper-raised"],
  ["focus", "paper"],
  ["focus", "paper-raised"],
  ["engraved-temper", "steel"],
  ["engraved-purple", "steel"],
];

describe("contrast", () => {
  it("is 21 between black and white, and 4.54 between #767676 and white", () => {
    // The second is the widely published lightest grey that passes 4.5:1 on white.
    expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 5);
    expect(contrast("#767676", "#ffffff")).toBeCloseTo(4.54, 2);
  });
});

describe.each([
  ["light", light],
  ["dark", dark],
  ["plate", plate],
])("tokens of the %s surface", (_surface, palette) => {
  const ratio = (one: string, other: string) => {
    const front = palette.get(one);
    const ground = palette.get(other);
    if (!front || !ground) throw new Error(`no colour for ${one} on ${other}`);
    return contrast(front, ground);
  };

  it.each(textPairs)("set %s on %s at 4.5:1 or more", (text, ground) => {
    expect(ratio(text, ground)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(graphicPairs)("draw %s on %s at 3:1 or more", (line, ground) => {
    expect(ratio(line, ground)).toBeGreaterThanOrEqual(3);
  });
});
