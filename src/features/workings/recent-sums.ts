/** A sum that was on the bench, kept in this browser alone. */
export interface RecentSum {
  calculator: string;
  /** Its inputs, as the query of its link. */
  query: string;
}

const key = "soapstone.bench";
const most = 6;

/** The latest first; none when the browser keeps nothing. */
export function recentSums(): RecentSum[] {
  try {
    const kept: unknown = JSON.parse(window.localStorage.getItem(key) ?? "[]");
    return Array.isArray(kept) ? kept.filter(isRecent).slice(0, most) : [];
  } catch {
    return [];
  }
}

/** Keeps a sum, one a calculator: the numbers last used. */
export function keepRecentSum(sum: RecentSum): void {
  const others = recentSums().filter(({ calculator }) => calculator !== sum.calculator);
  try {
    window.localStorage.setItem(key, JSON.stringify([sum, ...others].slice(0, most)));
  } catch {
    // Storage is full or switched off: the bench works without.
  }
}

function isRecent(value: unknown): value is RecentSum {
  const { calculator, query } = (value ?? {}) as Partial<RecentSum>;
  return typeof calculator === "string" && /^[a-z0-9-]+$/.test(calculator) && typeof query === "string";
}
