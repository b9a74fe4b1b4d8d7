/** The ways a template leaves the site. */
const kinds = [
  { label: "PDF, A4", format: "pdf", query: { paper: "a4" } },
  { label: "PDF, Letter", format: "pdf", query: { paper: "letter" } },
  { label: "SVG", format: "svg", query: {} },
  { label: "DXF", format: "dxf", query: {} },
] as const;

/**
 * Links to the full-size template with these numbers in it.
 *
 * @param base where this working's templates are, without the format
 * @param inputs only what differs from what the server keeps under that address
 */
export function templateLinks(
  base: string,
  inputs: Record<string, unknown>,
): { label: string; href: string }[] {
  return kinds.map(({ label, format, query }) => {
    const words = Object.entries({ ...query, ...inputs }).map(([name, value]) => [name, String(value)]);
    const search = new URLSearchParams(words).toString();
    return { label, href: `${base}/${format}${search && `?${search}`}` };
  });
}
