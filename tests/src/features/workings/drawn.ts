import { XMLParser } from "fast-xml-parser";
import { createElement } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import { runCalculator } from "#shared/calculators/registry.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { drawings } from "#src/features/workings/drawings.ts";

type Node = { ":@"?: Record<string, string> } & Record<string, unknown>;

/** One drawing as it is marked up: how far its marks reach, what it says, how large it is. */
export interface Drawn {
  width: number;
  height: number;
  title: string;
  description: string;
  words: { text: string; left: number; right: number; baseline: number; size: number }[];
  /** Every place that a line, circle or bar reaches. */
  places: [x: number, y: number][];
}

/** The markup of a calculator's drawing, as the server makes it. */
export function drawingMarkup(id: string, inputs: object, units: LengthUnits = "mm"): string {
  const run = runCalculator(id, inputs);
  if (!run.ok) throw new Error(run.issue.message);
  const flat = drawings[id]?.flat;
  if (!flat) throw new Error(`${id} has no drawing`);
  const { inputs: read, results } = run.value;
  return renderToStaticMarkup(createElement(flat, { inputs: read, results, units }));
}

/** Reads the drawings out of the markup. Letters of the mono face are 0.6 em wide. */
export function drawn(markup: string): Drawn[] {
  const parser = new XMLParser({
    ignoreAttributes: false,
    preserveOrder: true,
    trimValues: false,
    parseTagValue: false,
    htmlEntities: true,
  });
  return [...markup.matchAll(/<svg[^>]*role="img".*?<\/svg>/gs)].map(([svg]) => {
    const [root] = parser.parse(svg) as Node[];
    const attributes = root?.[":@"] ?? {};
    const [, , width = 0, height = 0] = (attributes["@_viewBox"] ?? "").split(" ").map(Number);
    // On a phone the wide drawings have larger letters: those are the ones that must fit.
    const size = Number(
      attributes["@_font-size"] ?? /text-\[(\d+)px\]/.exec(attributes["@_class"] ?? "")?.[1],
    );
    const sheet: Drawn = { width, height, title: "", description: "", words: [], places: [] };
    for (const child of (root?.svg ?? []) as Node[]) read(child, sheet, size);
    return sheet;
  });
}

function read(node: Node, sheet: Drawn, size: number): void {
  const attribute = (name: string) => node[":@"]?.[`@_${name}`] ?? "";
  const number = (name: string) => Number(attribute(name));
  if (node.title) sheet.title = textOf(node.title);
  else if (node.desc) sheet.description = textOf(node.desc);
  else if (node.text) {
    const text = textOf(node.text);
    const wide = text.length * size * 0.6;
    const anchor = attribute("text-anchor");
    const left = number("x") - (anchor === "middle" ? wide / 2 : anchor === "end" ? wide : 0);
    if (text) sheet.words.push({ text, left, right: left + wide, baseline: number("y"), size });
  } else if (node.path) {
    for (const [, x, y] of attribute("d").matchAll(/[ML]([-\d.e]+) ([-\d.e]+)/g)) {
      sheet.places.push([Number(x), Number(y)]);
    }
  } else if (node.circle) {
    const [x, y, r] = [number("cx"), number("cy"), number("r")];
    sheet.places.push([x - r, y - r], [x + r, y + r]);
  } else if (node.rect) {
    const [x, y] = [number("x"), number("y")];
    sheet.places.push([x, y], [x + number("width"), y + number("height")]);
  } else if (node.g) {
    for (const child of node.g as Node[]) read(child, sheet, size);
  }
}

function textOf(children: unknown): string {
  return (children as Record<string, unknown>[]).map((child) => String(child["#text"] ?? "")).join("");
}
