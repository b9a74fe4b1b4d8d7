/** Longest address a link may have, in characters. */
export const longestHref = 2000;

const allowed = /^(?:https?:\/\/[^/?#]|mailto:[^?\s]+@|\/(?![/\\]))/i;

/**
 * Whether a link may point there: `http:`, `https:`, `mailto:`, or a path on this site with one leading slash.
 *
 * Spaces, control characters and backslashes are refused anywhere, since browsers drop or turn some of them while
 * reading an address and would then see another one (`java\tscript:`, `/\evil.example`).
 *
 * @see WHATWG URL Standard, section 4.4: tab and newline are removed, `\` reads as `/` in http addresses
 */
export function isAllowedHref(href: unknown): href is string {
  return (
    typeof href === "string" && href.length <= longestHref && !hasUnsafeCharacter(href) && allowed.test(href)
  );
}

/** Whether a link leads to another site, which says so in its `rel`. */
export function leavesSite(href: string): boolean {
  return !href.startsWith("/");
}

function hasUnsafeCharacter(href: string): boolean {
  for (const character of href) {
    const code = character.codePointAt(0) ?? 0;
    if (code <= 0x20 || (code >= 0x7f && code <= 0xa0) || character === "\\") return true;
    if (code === 0x2028 || code === 0x2029 || code === 0xfeff) return true;
  }
  return false;
}
