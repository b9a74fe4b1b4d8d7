import { clsx } from "clsx";
import { Link } from "react-router";
import { Disclosure } from "./disclosure.tsx";
import { SteelRuleBlade } from "./steel-rule-blade.tsx";
import { type RuleScale, ruleScale, ruleX, spread } from "./steel-rule-layout.ts";

export type RuleTick = {
  /** UTC milliseconds. */
  date: number;
  /** Stamped on the tab: an entry's number. */
  number: string;
  label: string;
  href: string;
  /** A stage's first entry: the longer tick. */
  major?: boolean;
  kind: "entry" | "overturned";
  /** For an overturned one: the date of what replaced or preceded it, where the line leads back to. */
  backTo?: number;
};

export type RulePhoto = { date: number; src: string; alt: string; href: string };

export type SteelRuleProps = {
  label: string;
  from: number;
  to: number;
  ticks: RuleTick[];
  photos: RulePhoto[];
};

const photoWidth = 96;
const photoHeight = 64;
const tabWidth = 48;
const bladeHeight = 80;
const date = new Intl.DateTimeFormat("en-GB", {
  day: "numeric",
  month: "short",
  year: "numeric",
  timeZone: "UTC",
});

/**
 * A build's time line as an engraved steel rule: entries are ticks with tabs below, photos stand above.
 * Plain HTML and SVG: scrolls and links work without JavaScript, and the same is there as a list.
 */
export function SteelRule({ label, from, to, ticks, photos }: SteelRuleProps) {
  const scale = ruleScale(from, to);
  const inOrder = ticks.toSorted((one, other) => one.date - other.date);
  const top = photos.length > 0 ? photoHeight + 28 : 4;
  return (
    <div className="steel-rule not-prose">
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must take the keyboard */}
      <section aria-label={label} tabIndex={0} className="steel-rule-scroller">
        <svg width={scale.width} height={top + bladeHeight + 120} className="block" role="presentation">
          <PhotoRow scale={scale} photos={photos} edge={top} />
          <SteelRuleBlade scale={scale} top={top} height={bladeHeight} />
          <BackLines scale={scale} ticks={inOrder} edge={top + bladeHeight} />
          <TickRow scale={scale} ticks={inOrder} edge={top + bladeHeight} />
        </svg>
      </section>
      <Disclosure summary="The same as a list" className="mt-2 border-b-0! text-sm">
        <RuleList ticks={inOrder} />
      </Disclosure>
    </div>
  );
}

function PhotoRow({ scale, photos, edge }: { scale: RuleScale; photos: RulePhoto[]; edge: number }) {
  const inOrder = photos.toSorted((one, other) => one.date - other.date);
  const wanted = inOrder.map((photo) => ruleX(scale, photo.date) - 12);
  const places = spread(wanted, photoWidth + 8, scale.width);
  return inOrder.map((photo, index) => {
    const x = places[index] ?? 0;
    const foot = ruleX(scale, photo.date);
    return (
      <g key={photo.src}>
        <path className="rule-leader" d={`M${foot} ${edge}V${edge - 8}L${x + 12} ${photoHeight + 4}`} />
        <foreignObject x={x} y={4} width={photoWidth} height={photoHeight}>
          <Link to={photo.href} className="rule-photo">
            <img src={photo.src} alt={photo.alt} width={photoWidth} height={photoHeight} loading="lazy" />
          </Link>
        </foreignObject>
      </g>
    );
  });
}

function BackLines({ scale, ticks, edge }: { scale: RuleScale; ticks: RuleTick[]; edge: number }) {
  const overturned = ticks.filter((tick) => tick.backTo !== undefined);
  return overturned.map((tick, lane) => {
    const y = edge + 9 + (lane % 3) * 6;
    const start = ruleX(scale, tick.date);
    const wanted = ruleX(scale, tick.backTo ?? tick.date);
    // The arrowhead stands beside the other tick, not on it.
    const end = wanted + Math.sign(start - wanted) * 7;
    return (
      <g key={tick.href} className="rule-back">
        <path d={`M${start} ${edge}V${y}H${end}V${edge + 2}`} />
        <path d={`M${end - 4} ${edge + 8}L${end} ${edge + 1}l4 7`} />
      </g>
    );
  });
}

function TickRow({ scale, ticks, edge }: { scale: RuleScale; ticks: RuleTick[]; edge: number }) {
  const places = spread(
    ticks.map((tick) => ruleX(scale, tick.date) - 8),
    tabWidth,
    scale.width,
  );
  const tabTop = edge + 30;
  return ticks.map((tick, index) => {
    const x = places[index] ?? 0;
    const room = (places[index + 1] ?? scale.width) - x - 8;
    const foot = ruleX(scale, tick.date);
    const over = tick.kind === "overturned";
    return (
      <g key={tick.href} className={over ? "rule-tick rule-tick-over" : "rule-tick"}>
        <path
          className={clsx("rule-tick-cut", tick.major && "rule-tick-major")}
          d={`M${foot} ${edge - (tick.major ? 33 : 20)}V${edge}`}
        />
        <path className="rule-tick-line" d={`M${foot} ${edge}v6L${x + 8} ${edge + 22}V${tabTop + 4}`} />
        <foreignObject x={x} y={tabTop} width={Math.min(Math.max(room, tabWidth - 4), 184)} height={88}>
          <Link to={tick.href} className="rule-tab" aria-label={spoken(tick)} title={tick.label}>
            <span className="rule-tab-number">
              {over ? <span aria-hidden="true">×</span> : null}
              {tick.number}
            </span>
            {room >= 84 ? <span className="rule-tab-label">{tick.label}</span> : null}
          </Link>
        </foreignObject>
      </g>
    );
  });
}

function RuleList({ ticks }: { ticks: RuleTick[] }) {
  return (
    <ol className="flex flex-col">
      {ticks.map((tick) => (
        <li key={tick.href} className="grid grid-cols-[6.5rem_minmax(0,1fr)] items-baseline gap-x-3">
          <time dateTime={new Date(tick.date).toISOString()} className="figures text-xs text-ink-soft">
            {date.format(tick.date)}
          </time>
          <span>
            <Link to={tick.href} className="inline-block py-2">
              {tick.number}. {tick.label}
            </Link>
            {tick.kind === "overturned" ? <span className="text-purple"> (overturned)</span> : null}
          </span>
        </li>
      ))}
    </ol>
  );
}

function spoken(tick: RuleTick): string {
  const state = tick.kind === "overturned" ? ", overturned" : "";
  return `${tick.number}. ${tick.label}, ${date.format(tick.date)}${state}`;
}
