import { useEffect } from "react";

/** Lifts the bar at the bottom edge above a phone's keyboard: `--keyboard-inset` is the height it covers. */
export function useKeyboardInset(): void {
  useEffect(() => {
    const viewport = window.visualViewport;
    if (!viewport) return;
    const { style } = document.documentElement;
    const update = () => {
      const covered = Math.max(0, window.innerHeight - viewport.height - viewport.offsetTop);
      style.setProperty("--keyboard-inset", `${Math.round(covered)}px`);
    };
    update();
    viewport.addEventListener("resize", update);
    viewport.addEventListener("scroll", update);
    return () => {
      viewport.removeEventListener("resize", update);
      viewport.removeEventListener("scroll", update);
      style.removeProperty("--keyboard-inset");
    };
  }, []);
}
