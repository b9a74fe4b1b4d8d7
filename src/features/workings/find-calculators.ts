interface Findable {
  name: string;
  purpose: string;
  group: string;
  words: readonly string[];
}

/**
 * Those that answer every word typed, best first: what a thing is called goes before what is said of it.
 * Nothing typed finds all, in the order given.
 */
export function findCalculatorsBy<C extends Findable>(
  calculators: readonly C[],
  typed: string,
): readonly C[] {
  const wanted = typed
    .toLowerCase()
    .split(/[\s,]+/)
    .filter(Boolean);
  if (wanted.length === 0) return calculators;
  return calculators
    .map((calculator) => ({ calculator, score: scoreOf(calculator, wanted) }))
    .filter(({ score }) => score > 0)
    .toSorted((a, b) => b.score - a.score)
    .map(({ calculator }) => calculator);
}

function scoreOf({ name, purpose, group, words }: Findable, wanted: readonly string[]): number {
  const called = [name, ...words].join(" ").toLowerCase();
  const said = [purpose, group].join(" ").toLowerCase();
  const scores = wanted.map((word) => {
    const stem = word.length > 4 ? word.replace(/(?:ing|s)$/, "") : word;
    return called.includes(stem) ? 2 : said.includes(stem) ? 1 : 0;
  });
  return scores.some((score) => score === 0) ? 0 : scores.reduce((sum: number, score) => sum + score, 0);
}
