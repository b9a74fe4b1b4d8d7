import { inputsToAddress } from "#shared/calculators/address.ts";
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
 * @param base of the working or calculator in the API
 * @param inputs only what differs from what the server keeps under that address
 */
export function templateAddresses(
  base: string,
  inputs: Record<string, unknown>,
): { label: string; paper?: Paper; href: string }[] {
  const query = inputsToAddress(inputs);
  return kinds.map(({ label, format, paper }) => ({
    label,
    ...(paper && { paper }),
    href: address(`${base}/template/${format}`, paper ? [["paper", paper], ...query] : query),
  }));
}

/** Links to the numbers themselves. */
export function numberAddresses(base: string, inputs: Record<string, unknown>) {
  return [
    { label: "CSV", href: address(`${base}/numbers/csv`, inputsToAddress(inputs)) },
    { label: "JSON", href: address(`${base}/numbers/json`, inputsToAddress(inputs)) },
  ];
}

function address(path: string, query: [string, string][]): string {
  const search = new URLSearchParams(query).toString();
  return search ? `${path}?${search}` : path;
}
