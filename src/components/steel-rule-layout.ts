/** Where things stand on a steel rule graduated in days. Lengths are CSS pixels, times UTC milliseconds. */

export const day = 86_400_000;
const endBlank = 28;
const shortest = 1036;

export type RuleScale = { from: number; days: number; perDay: number; width: number };
export type Graduation = { x: number; size: "day" | "week" | "month"; label?: string };

/** Picks a scale the length can be read at: wide days for weeks of work, narrow ones for years. */
export function ruleScale(from: number, to: number): RuleScale {
  const start = Math.floor(from / day) * day;
  const days = Math.max(1, Math.ceil((to - start) / day));
  const natural = days <= 45 ? 16 : days <= 150 ? 8 : days <= 420 ? 4 : days <= 1100 ? 2 : 1;
  const perDay = Math.max(natural, shortest / days);
  return { from: start, days, perDay, width: Math.round(days * perDay) + endBlank * 2 + 28 };
}

export function ruleX(scale: RuleScale, date: number): number {
  return Math.round((endBlank + ((date - scale.from) / day) * scale.perDay) * 10) / 10;
}

const monthName = new Intl.DateTimeFormat("en-GB", { month: "short", timeZone: "UTC" });

/** Days, weeks (Mondays) and months, leaving out what would be finer than the eye can part. */
export function graduations(scale: RuleScale): Graduation[] {
  const { from, days, perDay } = scale;
  const marks: Graduation[] = [];
  for (let count = 0; count <= days; count += 1) {
    const date = new Date(from + count * day);
    const x = ruleX(scale, date.getTime());
    if (date.getUTCDate() === 1) marks.push({ x, size: "month", label: monthLabel(date, perDay) });
    else if (date.getUTCDay() === 1 && perDay >= 1.5) {
      marks.push(perDay >= 7 ? { x, size: "week", label: String(date.getUTCDate()) } : { x, size: "week" });
    } else if (perDay >= 3.5) marks.push({ x, size: "day" });
  }
  return marks;
}

function monthLabel(date: Date, perDay: number): string {
  const month = monthName.format(date);
  const room = perDay * 28;
  if (room >= 80) return `${month} ${date.getUTCFullYear()}`;
  // The year takes January's place and, where that is narrow, February's too.
  if (room < 34 && date.getUTCMonth() === 1) return "";
  if (date.getUTCMonth() === 0) return String(date.getUTCFullYear());
  return room >= 34 ? month : month.charAt(0);
}

/** Sets things of one width in a row near their wanted places, in order, none on top of the one before. */
export function spread(wanted: number[], width: number, limit: number): number[] {
  const places: number[] = [];
  for (const want of wanted) {
    const before = places.at(-1);
    places.push(before === undefined ? Math.max(0, want) : Math.max(want, before + width));
  }
  // What ran past the end is pushed back, from the last to the first.
  for (let index = places.length - 1, edge = limit; index >= 0; index -= 1) {
    const place = Math.min(places[index] ?? 0, edge - width);
    places[index] = place;
    edge = place;
  }
  return places;
}
