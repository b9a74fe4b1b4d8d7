import { withCheckBars } from "./check-bars.ts";
import type { Layer, TemplateNames, TemplateSheet } from "./sheet.ts";

const pens: Record<Layer, { stroke: string; width: number; dash?: string }> = {
  cut: { stroke: "#000000", width: 0.3 },
  inside: { stroke: "#777777", width: 0.2, dash: "2 1.2" },
  datum: { stroke: "#1c5787", width: 0.3 },
  guide: { stroke: "#777777", width: 0.15, dash: "6 1 1 1" },
  edge: { stroke: "#000000", width: 0.15 },
  check: { stroke: "#000000", width: 0.2 },
};

/** Room around the drawing, mm. */
const border = 5;

/**
 * Writes a template as SVG at full size: one user unit is one mm, and width and height say so.
 *
 * @returns a complete document, one group for each layer
 */
export function templateSvg(sheet: TemplateSheet, names: TemplateNames): string {
  const { bounds, lines, labels } = withCheckBars(sheet);
  const width = number(bounds.right - bounds.left + 2 * border);
  const height = number(bounds.bottom - bounds.top + 2 * border);
  const view = `${number(bounds.left - border)} ${number(bounds.top - border)} ${width} ${height}`;
  const groups = (Object.keys(pens) as Layer[]).map((layer) => {
    const { stroke, width: strokeWidth, dash } = pens[layer];
    const paths = lines
      .filter((line) => line.layer === layer)
      .map((line) => `    <path d="${path(line.points)}"/>`);
    const dashes = dash ? ` stroke-dasharray="${dash}"` : "";
    return `  <g id="${layer}" fill="none" stroke="${stroke}" stroke-width="${strokeWidth}"${dashes}>\n${paths.join("\n")}\n  </g>`;
  });
  const texts = labels.map(
    ({ at: [x, y], size, anchor, text }) =>
      `    <text x="${number(x)}" y="${number(y)}" font-size="${number(size)}" text-anchor="${anchor}">${escapeXml(text)}</text>`,
  );
  return [
    `<?xml version="1.0" encoding="UTF-8"?>`,
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}mm" height="${height}mm" viewBox="${view}">`,
    `  <title>${escapeXml(`${names.build}: ${names.working}`)}</title>`,
    `  <desc>${escapeXml([...sheet.facts.map((fact) => `${fact.label} ${fact.value}`), names.date].join(", "))}</desc>`,
    ...groups,
    `  <g id="text" fill="#000000" font-family="sans-serif">\n${texts.join("\n")}\n  </g>`,
    `</svg>`,
    ``,
  ].join("\n");
}

function path(points: readonly (readonly [number, number])[]): string {
  return points.map(([x, y], index) => `${index === 0 ? "M" : "L"}${number(x)} ${number(y)}`).join("");
}

/** A thousandth of a millimetre is finer than any machine that reads this. */
function number(value: number): string {
  return String(Number(value.toFixed(3)));
}

const entities: Record<string, string> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&apos;",
};

function escapeXml(text: string): string {
  // Control characters and halves of pairs cannot stand in XML at all, escaped or not.
  return text
    .replace(/[\p{Cc}\p{Cs}\ufffe\uffff]/gu, " ")
    .replace(/[&<>"']/g, (sign) => entities[sign] ?? "");
}
