import { type KeyboardEvent, useCallback, useState } from "react";

const steps: Record<string, number> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/**
 * One stop of the Tab key for a whole toolbar; arrows, Home and End go from tool to tool. Tools carry `data-tool`.
 *
 * @see WAI-ARIA Authoring Practices, toolbar pattern
 */
export function useRovingFocus(first: string) {
  const [current, setCurrent] = useState(first);
  const onKeyDown = useCallback((event: KeyboardEvent<HTMLElement>) => {
    const tools = [...event.currentTarget.querySelectorAll<HTMLElement>("[data-tool]")];
    const at = tools.indexOf(document.activeElement as HTMLElement);
    if (at < 0) return;
    const step = steps[event.key];
    const target =
      event.key === "Home"
        ? 0
        : event.key === "End"
          ? tools.length - 1
          : step && (at + step + tools.length) % tools.length;
    if (target === undefined) return;
    event.preventDefault();
    tools[target]?.focus();
  }, []);
  const stop = (id: string) => ({
    "data-tool": id,
    tabIndex: id === current ? 0 : -1,
    onFocus: () => setCurrent(id),
  });
  return { onKeyDown, stop };
}
