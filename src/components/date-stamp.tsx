import { clsx } from "clsx";

type DateStampProps = {
  /** UTC milliseconds. */
  at: number;
  /** UTC milliseconds; with it the distance is given beside the date. Take it from the loader, so that server and browser agree. */
  now?: number;
  withTime?: boolean;
  /** The distance on a line of its own, where a margin has the room (from `md` up). */
  stacked?: boolean;
};

const date = new Intl.DateTimeFormat("en-GB", {
  day: "numeric",
  month: "long",
  year: "numeric",
  timeZone: "UTC",
});
const time = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", timeZone: "UTC" });
const relative = new Intl.RelativeTimeFormat("en-GB", { numeric: "auto" });

const minute = 60_000;
const steps: [Intl.RelativeTimeFormatUnit, number][] = [
  ["year", 365.25 * 1440 * minute],
  ["month", 30.44 * 1440 * minute],
  ["week", 7 * 1440 * minute],
  ["day", 1440 * minute],
  ["hour", 60 * minute],
  ["minute", minute],
];

function distance(at: number, now: number): string {
  const between = at - now;
  for (const [unit, length] of steps) {
    if (Math.abs(between) >= length) return relative.format(Math.trunc(between / length), unit);
  }
  return "just now";
}

/** The date in full, the distance beside it. */
export function DateStamp({ at, now, withTime = false, stacked = false }: DateStampProps) {
  const when = new Date(at);
  return (
    <span>
      <time dateTime={when.toISOString()}>
        {date.format(when)}
        {withTime ? `, ${time.format(when)} UTC` : ""}
      </time>
      {now === undefined ? null : (
        <span className={clsx("text-ink-soft", stacked && "md:block")}>
          <span className={stacked ? "md:hidden" : undefined}> · </span>
          {distance(at, now)}
        </span>
      )}
    </span>
  );
}
