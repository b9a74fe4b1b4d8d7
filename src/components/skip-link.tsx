/** First in the tab order of every page; `main` carries the id. */
export function SkipLink({ target = "content" }: { target?: string }) {
  return (
    <a
      href={`#${target}`}
      data-chrome
      className="not-focus:sr-only fixed top-2 left-2 z-50 rounded bg-paper-raised px-4 py-3 font-semibold shadow-lifted"
    >
      Skip to the content
    </a>
  );
}
