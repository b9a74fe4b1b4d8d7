import type { PageSettings } from "#shared/contracts/rendering.ts";

/** A page ready to send but for its nonce, which belongs between the pieces. */
export interface FinishedPage {
  status: number;
  pieces: Buffer[];
}

/** Finished pages for signed-out readers, good until anything public changes. */
export interface PageCache {
  /** The site's present version: read before drawing, given to `set` after. */
  version(): number;
  get(key: string): FinishedPage | undefined;
  set(key: string, page: FinishedPage, version: number): void;
}

/** Everything that a signed-out reader's page depends on, beside what is in the database. */
export function pageCacheKey(url: string, settings: PageSettings): string {
  return `${settings.scheme} ${settings.units} ${url}`;
}

/**
 * Keeps finished pages while the site's version (raised by triggers on what pages show) stays the same,
 * so that several server processes on one file agree without talking to each other.
 *
 * @param siteVersion reads the present version
 * @param most how many pages are kept; the one longest unused goes first
 * @param lifetime after so many ms a page is drawn again whatever else, for what depends on the time
 */
export function createPageCache(
  siteVersion: () => number,
  clock: () => number,
  most = 500,
  lifetime = 60_000,
): PageCache {
  const kept = new Map<string, { page: FinishedPage; version: number; until: number }>();
  return {
    version: siteVersion,
    get(key) {
      const found = kept.get(key);
      if (!found) return undefined;
      kept.delete(key);
      if (found.version !== siteVersion() || found.until < clock()) return undefined;
      kept.set(key, found);
      return found.page;
    },
    set(key, page, version) {
      kept.set(key, { page, version, until: clock() + lifetime });
      const oldest = kept.size > most ? kept.keys().next().value : undefined;
      if (oldest !== undefined) kept.delete(oldest);
    },
  };
}

/** For development, where every page is drawn afresh. */
export const noPageCache: PageCache = { version: () => 0, get: () => undefined, set: () => {} };
