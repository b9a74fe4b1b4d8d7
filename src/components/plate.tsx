import { clsx } from "clsx";
import type { ReactNode } from "react";

type PlateProps = {
  title: ReactNode;
  /** Heading level, so that the plate fits the page's outline. */
  level?: 2 | 3 | 4;
  /** A number tag, at the left of the title strip. */
  number?: ReactNode;
  /** Small print at the right of the strip: where it is from, whose it is. */
  aside?: ReactNode;
  /** The drawing; give an SVG with its own title. */
  drawing?: ReactNode;
  /** Inputs, results, whatever belongs beside the drawing. */
  children?: ReactNode;
  actions?: ReactNode;
  className?: string;
  id?: string;
};

/** The dark surface for anything computed: title strip, drawing, numbers, and what can be done with them. */
export function Plate(props: PlateProps) {
  const { title, level = 3, number, aside, drawing, children, actions, className, id } = props;
  const Heading = `h${level}` as const;
  return (
    <section id={id} className={clsx("plate not-prose @container font-sans text-sm", className)}>
      <header className="flex min-h-12 flex-wrap items-center gap-x-3 gap-y-1 border-b border-plate-line px-3 py-2 sm:px-4">
        {number}
        <Heading className="min-w-0 flex-1 text-sm leading-tight font-semibold tracking-normal">
          {title}
        </Heading>
        {aside ? <div className="text-xs text-chalk-soft max-sm:basis-full">{aside}</div> : null}
      </header>
      <div className={clsx(drawing && children ? "grid @2xl:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]" : "")}>
        {drawing ? <div className="plate-drawing">{drawing}</div> : null}
        {children ? <div className="flex min-w-0 flex-col gap-4 p-3 sm:p-4">{children}</div> : null}
      </div>
      {actions ? (
        <footer className="no-print flex flex-wrap gap-2 border-t border-plate-line px-3 py-2 sm:px-4">
          {actions}
        </footer>
      ) : null}
    </section>
  );
}
