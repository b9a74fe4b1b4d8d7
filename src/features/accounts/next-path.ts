const anyOrigin = "http://own.invalid";

/**
 * Where to go after signing in: the page that was asked for, as long as it is one of our own. Anything a
 * browser would read as another site, or as no path at all, gives `otherwise`.
 */
export function nextPath(wanted: string | null, otherwise: string): string {
  if (!wanted?.startsWith("/")) return otherwise;
  const url = URL.canParse(wanted, anyOrigin) ? new URL(wanted, anyOrigin) : null;
  if (url?.origin !== anyOrigin || url.pathname.startsWith("//")) return otherwise;
  return url.pathname + url.search + url.hash;
}
