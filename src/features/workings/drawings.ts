import { type ComponentType, lazy } from "react";
import { CopeDrawing } from "./components/cope-drawing.tsx";
import type { DrawingProps } from "./drawing-props.ts";

interface Drawing {
  flat: ComponentType<DrawingProps>;
  /** The same thing to be turned round; its code comes when it is asked for. */
  solid?: ComponentType<DrawingProps>;
}

/** A drawing knows its own calculator's inputs and results; they come from the registry, which pairs them. */
function drawing<Inputs, Results>(
  flat: ComponentType<DrawingProps<Inputs, Results>>,
  solid?: ComponentType<DrawingProps<Inputs, Results>>,
): Drawing {
  return { flat, solid } as unknown as Drawing;
}

/** Drawings by calculator id. A calculator without one shows its numbers alone. */
export const drawings: Readonly<Record<string, Drawing>> = {
  "saddle-cope": drawing(
    CopeDrawing,
    lazy(async () => ({ default: (await import("./components/joint-view-3d.tsx")).JointView3d })),
  ),
};
