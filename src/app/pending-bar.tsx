import { useNavigation } from "react-router";

/** A chalk stroke along the top while the next page is on its way; a quick change never shows it. */
export function PendingBar() {
  const coming = useNavigation().state !== "idle";
  return (
    <div role="status" data-chrome className="pointer-events-none fixed inset-x-0 top-0 z-50">
      {coming ? (
        <>
          <span className="sr-only">Loading the page</span>
          <span className="pending-stroke" />
        </>
      ) : null}
    </div>
  );
}
