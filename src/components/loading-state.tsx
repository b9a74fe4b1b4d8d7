import { clsx } from "clsx";

type LoadingStateProps = { label: string; lines?: number; plate?: boolean };

const widths = ["w-full", "w-11/12", "w-4/5", "w-full", "w-3/5"];

/** Holds the place of what is coming, said once for a screen reader. */
export function LoadingState({ label, lines = 4, plate = false }: LoadingStateProps) {
  return (
    <div role="status" className="flex flex-col gap-4">
      <span className="sr-only">{label}</span>
      {plate ? <div aria-hidden="true" className="plate aspect-[16/9] w-full animate-scribe" /> : null}
      {Array.from({ length: lines }, (_, line) => (
        <div
          // biome-ignore lint/suspicious/noArrayIndexKey: the lines are alike and never reorder
          key={line}
          aria-hidden="true"
          className={clsx("h-3 animate-scribe rounded bg-hairline", widths[line % widths.length])}
        />
      ))}
    </div>
  );
}
