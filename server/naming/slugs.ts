import slugify from "@sindresorhus/slugify";

const longest = 60;

/** The address a title suggests: small letters, digits and hyphens, cut at a word. */
export function slugFromTitle(title: string, whenEmpty: string): string {
  const whole = slugify(title, { decamelize: false }).replace(/[^a-z0-9-]/g, "");
  if (whole.length <= longest) return whole || whenEmpty;
  return whole
    .slice(0, longest + 1)
    .replace(/-[^-]*$/, "")
    .slice(0, longest);
}

/** The address itself, or the first of `name-2`, `name-3`, … that nothing has. */
export function freeSlug(wanted: string, isTaken: (slug: string) => boolean): string {
  if (!isTaken(wanted)) return wanted;
  let number = 2;
  while (isTaken(`${wanted}-${number}`)) number += 1;
  return `${wanted}-${number}`;
}
