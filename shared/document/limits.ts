/** How large a document may be. Far above any real entry, far below what would harm the server. */
export const documentLimits = {
  /** Levels of JSON below the document, counting arrays and objects alike. */
  depth: 64,
  /** JSON values in all. */
  values: 200_000,
  /** Characters of text in all, attributes and names included. */
  characters: 600_000,
} as const;

/**
 * Walks raw JSON without recursion and without trusting it, and says what is too much of it.
 *
 * @returns a message for the person, or null when it keeps the limits
 */
export function sizeProblem(json: unknown): string | null {
  const waiting: { value: unknown; depth: number }[] = [{ value: json, depth: 0 }];
  let values = 0;
  let characters = 0;
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    const { value, depth } = next;
    values += 1;
    if (typeof value === "string") characters += value.length;
    if (depth > documentLimits.depth) return "Some blocks are nested too deeply. Take a few levels out.";
    if (typeof value === "object" && value !== null) {
      for (const [key, child] of Object.entries(value)) {
        if (!Array.isArray(value)) characters += key.length;
        waiting.push({ value: child, depth: depth + 1 });
      }
    }
    if (values > documentLimits.values || characters > documentLimits.characters) {
      return "The entry is too long to keep as one. Divide it into two.";
    }
  }
  return null;
}
