import type { Paper } from "#shared/templates/tiling.ts";

/** The ways a template leaves the site. */
const kinds: readonly { label: string; format: string; paper?: Paper }[] = [
  { label: "PDF, A4", format: "pdf", paper: "a4" },
  { label: "PDF, Letter", format: "pdf", paper: "letter" },
  { label: "SVG", format: "svg" },
  { label: "DXF", format: "dxf" },
];

/**
 * Links to the full-size template with these numbers in it.
 *
 * @param base where this working's templates are, without the format
 * @param inputs only what differs from what the server keeps under that address
 */
export function templateAddresses(
  base: string,
  inputs: Record<string, unknown>,
): { label: string; paper?: Paper; href: string }[] {
  return kinds.map(({ label, format, paper }) => {
    const words = Object.entries({ ...(paper && { paper }), ...inputs }).map(([name, value]) => [
      name,
      String(value),
    ]);
    const search = new URLSearchParams(words).toString();
    return { label, ...(paper && { paper }), href: `${base}/${format}${search && `?${search}`}` };
  });
}
