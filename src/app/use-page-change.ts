import { useEffect, useRef, useState } from "react";
import { useLocation } from "react-router";

/**
 * What a browser does by itself when a page is loaded, done for a change of page within the application:
 * open menus close, focus goes to the new page's heading, and its title is returned to be announced.
 */
export function usePageChange(): string {
  const { pathname, search } = useLocation();
  const page = pathname + search;
  const shown = useRef(page);
  const [title, setTitle] = useState("");
  useEffect(() => {
    if (shown.current === page) return;
    shown.current = page;
    for (const menu of document.querySelectorAll("header details[open]")) menu.removeAttribute("open");
    const heading = document.querySelector<HTMLElement>("#content h1") ?? document.getElementById("content");
    heading?.setAttribute("tabindex", "-1");
    heading?.focus({ preventScroll: true });
    setTitle(document.title);
  }, [page]);
  return title;
}

/** Closes the header's open menu on Escape (focus goes back to its handle) and on a press elsewhere. */
export function useMenuClosing(): void {
  useEffect(() => {
    const close = (event: KeyboardEvent | PointerEvent) => {
      const menu = document.querySelector("header details[open]");
      if (!menu) return;
      if (event instanceof KeyboardEvent ? event.key !== "Escape" : menu.contains(event.target as Node))
        return;
      menu.removeAttribute("open");
      if (event instanceof KeyboardEvent) menu.querySelector("summary")?.focus();
    };
    document.addEventListener("keydown", close);
    document.addEventListener("pointerdown", close);
    return () => {
      document.removeEventListener("keydown", close);
      document.removeEventListener("pointerdown", close);
    };
  }, []);
}
