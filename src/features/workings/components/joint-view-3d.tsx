import { type KeyboardEvent, useEffect, useRef, useState } from "react";
import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { type JointScene, openJointScene } from "../joint-scene.ts";

const turn = 0.12;
const turns: Record<string, [around: number, over: number]> = {
  ArrowLeft: [-turn, 0],
  ArrowRight: [turn, 0],
  ArrowUp: [0, -turn],
  ArrowDown: [0, turn],
};

/** The coped branch on its header, turned by pointer or arrow keys. Says so when the browser has no WebGL. */
export function JointView3d({ inputs, results }: DrawingProps<SaddleCopeInputs, SaddleCopeResults>) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const scene = useRef<JointScene | null>(null);
  const [missing, setMissing] = useState(false);

  useEffect(() => {
    if (!canvas.current) return;
    scene.current = openJointScene(canvas.current);
    setMissing(scene.current === null);
    return () => {
      scene.current?.close();
      scene.current = null;
    };
  }, []);

  useEffect(() => scene.current?.show(inputs, results), [inputs, results]);

  const handleKey = (event: KeyboardEvent) => {
    const move = turns[event.key];
    if (!move) return;
    event.preventDefault();
    scene.current?.turn(...move);
  };

  if (missing) {
    return (
      <p role="status" className="p-4">
        This browser cannot show the joint in the round. The drawing above has the same shape.
      </p>
    );
  }
  return (
    <figure>
      <canvas
        ref={canvas}
        tabIndex={0}
        role="img"
        aria-label="The joint in the round. Turn it with the arrow keys."
        onKeyDown={handleKey}
        className="block aspect-4/3 max-h-[70vh] w-full touch-none"
      />
      <figcaption className="p-2 text-xs text-chalk-soft">Drag to turn it, or use the arrow keys.</figcaption>
    </figure>
  );
}
