import ArrowRight from "lucide-react/icons/arrow-right";
import type { ReactNode } from "react";
import { LinkButton } from "./link-button.tsx";

/** On to the next page of a list that is read newest first. Nothing when there is no more. */
export function OlderLink({ to, children = "Older" }: { to: string | null; children?: ReactNode }) {
  if (to === null) return null;
  return (
    <nav aria-label="More of this list" className="mt-6">
      <LinkButton to={to} rel="next">
        {children}
        <ArrowRight aria-hidden="true" className="size-4" />
      </LinkButton>
    </nav>
  );
}
