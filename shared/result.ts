/**
 * The outcome of a function whose failure is an ordinary case, such as a number half typed.
 * Faults that nobody expects are thrown instead.
 */
export type Result<Value, Issue> = { ok: true; value: Value } | { ok: false; issue: Issue };

/** Wraps a value that was worked out. */
export function ok<Value>(value: Value): { ok: true; value: Value } {
  return { ok: true, value };
}

/** Wraps the reason a value could not be worked out. */
export function fail<Issue>(issue: Issue): { ok: false; issue: Issue } {
  return { ok: false, issue };
}
