const clock = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit" });
const dayAndClock = new Intl.DateTimeFormat("en-GB", {
  weekday: "long",
  day: "numeric",
  month: "long",
  year: "numeric",
  hour: "2-digit",
  minute: "2-digit",
});
const relative = new Intl.RelativeTimeFormat("en-GB", { numeric: "always" });
const minute = 60_000;
const day = 24 * 60 * minute;

/** `14:03` today, the date with it otherwise. In the person's own time zone: only for the browser. */
export function clockTime(at: number, now: number): string {
  const sameDay = new Date(at).toDateString() === new Date(now).toDateString();
  return sameDay ? clock.format(at) : dayAndClock.format(at);
}

/** `Thursday, 3 December 2026 at 07:00, in 2 days`. */
export function momentInWords(at: number, now: number): string {
  const between = at - now;
  const steps = [
    ["day", day],
    ["hour", 60 * minute],
    ["minute", minute],
  ] as const;
  const [unit, length] = steps.find(([, size]) => Math.abs(between) >= size) ?? ["minute", minute];
  return `${dayAndClock.format(at)}, ${relative.format(Math.round(between / length), unit)}`;
}

/** The value of a `datetime-local` field for a moment, in the person's own time zone. */
export function localFieldValue(at: number): string {
  const local = new Date(at - new Date(at).getTimezoneOffset() * minute);
  return local.toISOString().slice(0, 16);
}

/** The moment that a `datetime-local` field means; null while it is empty or half typed. */
export function momentOfField(value: string): number | null {
  const at = new Date(value).getTime();
  return value === "" || Number.isNaN(at) ? null : at;
}
