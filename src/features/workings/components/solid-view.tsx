import { clsx } from "clsx";
import { Component, type ComponentType, type ReactNode, Suspense, useState } from "react";
import { Button } from "#src/components/button.tsx";
import type { DrawingProps } from "../drawing-props.ts";

/** Keeps the still drawing when the browser cannot draw solids or their code did not come. */
class StillInstead extends Component<{ children: ReactNode }, { failed: boolean }> {
  override state = { failed: false };
  static getDerivedStateFromError() {
    return { failed: true };
  }
  override render() {
    if (!this.state.failed) return this.props.children;
    return (
      <p role="status" className="p-4">
        This browser cannot show the joint in the round. The drawing above has the same shape.
      </p>
    );
  }
}

/** Opens the joint in the round when asked; its code is fetched then and not before. */
export function SolidView({
  solid: Solid,
  ...drawing
}: DrawingProps & { solid: ComponentType<DrawingProps> }) {
  const [open, setOpen] = useState(false);
  return (
    <div className={clsx("no-print", open && "basis-full")}>
      <Button aria-expanded={open} onClick={() => setOpen(!open)}>
        {open ? "Close the 3D view" : "Turn the joint round in 3D"}
      </Button>
      {open ? (
        <div className="mt-3 border border-plate-line">
          <StillInstead>
            <Suspense fallback={<p className="p-4">Fetching the 3D view…</p>}>
              <Solid {...drawing} />
            </Suspense>
          </StillInstead>
        </div>
      ) : null}
    </div>
  );
}
