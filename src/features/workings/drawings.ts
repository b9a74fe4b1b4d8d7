import { type ComponentType, lazy } from "react";
import { BoltDrawing } from "./components/bolt-drawing.tsx";
import { CopeDrawing } from "./components/cope-drawing.tsx";
import { CornerWeightsDrawing } from "./components/corner-weights-drawing.tsx";
import { FilletWeldDrawing } from "./components/fillet-weld-drawing.tsx";
import { MitreDrawing } from "./components/mitre-drawing.tsx";
import { SheetBendDrawing } from "./components/sheet-bend-drawing.tsx";
import { SpringRideDrawing } from "./components/spring-ride-drawing.tsx";
import { SteeringAxisDrawing } from "./components/steering-axis-drawing.tsx";
import { StockCuttingDrawing } from "./components/stock-cutting-drawing.tsx";
import { StrutCurveDrawing } from "./components/strut-curve-drawing.tsx";
import { StrutDrawing } from "./components/strut-drawing.tsx";
import { TapDrillDrawing } from "./components/tap-drill-drawing.tsx";
import { TubeBendDrawing } from "./components/tube-bend-drawing.tsx";
import { TubePieceDrawing } from "./components/tube-piece-drawing.tsx";
import { TubeSectionDrawing } from "./components/tube-section-drawing.tsx";
import { WishboneTravelDrawing } from "./components/wishbone-travel-drawing.tsx";
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
  mitre: drawing(MitreDrawing),
  "tube-piece": drawing(TubePieceDrawing),
  bolt: drawing(BoltDrawing),
  "fillet-weld": drawing(FilletWeldDrawing),
  "sheet-bend": drawing(SheetBendDrawing),
  "strut-curve": drawing(StrutCurveDrawing),
  strut: drawing(StrutDrawing),
  "tap-drill": drawing(TapDrillDrawing),
  "tube-section": drawing(TubeSectionDrawing),
  "wishbone-travel": drawing(WishboneTravelDrawing),
  "stock-cutting": drawing(StockCuttingDrawing),
  "steering-axis": drawing(SteeringAxisDrawing),
  "tube-bend": drawing(TubeBendDrawing),
  "corner-weights": drawing(CornerWeightsDrawing),
  "spring-ride": drawing(SpringRideDrawing),
};
