import { useSyncExternalStore } from "react";

const never = () => () => undefined;

/** False on the server and until the browser has taken the page over: a form sent before that would be lost. */
export function useHydrated(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
