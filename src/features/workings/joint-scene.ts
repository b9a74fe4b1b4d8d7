import {
  AmbientLight,
  DirectionalLight,
  DoubleSide,
  Group,
  Mesh,
  MeshStandardMaterial,
  PerspectiveCamera,
  Scene,
  Spherical,
  Vector3,
  WebGLRenderer,
} from "three";
import { OrbitControls } from "three/addons/controls/OrbitControls.js";
import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import { branchGeometry, headerGeometry } from "./joint-mesh.ts";

export interface JointScene {
  show(inputs: SaddleCopeInputs, results: SaddleCopeResults): void;
  /** Radians round the joint, and over it. */
  turn(around: number, over: number): void;
  close(): void;
}

/** Sets a scene up on a canvas; null when the browser has no WebGL. Drawn when something changes, not all the time. */
export function openJointScene(canvas: HTMLCanvasElement): JointScene | null {
  const renderer = createRenderer(canvas);
  if (!renderer) return null;
  const scene = new Scene();
  const camera = new PerspectiveCamera(32, 4 / 3, 0.1, 100);
  camera.position.set(3, 2.6, 6.6);
  const sun = new DirectionalLight(0xffffff, 2.2);
  sun.position.set(3, 6, 4);
  const joint = new Group();
  scene.add(joint, sun, new AmbientLight(0xcfd8dd, 1.1));
  const draw = () => renderer.render(scene, camera);
  const controls = new OrbitControls(camera, canvas);
  controls.enablePan = false;
  controls.minDistance = 2;
  controls.maxDistance = 14;
  controls.addEventListener("change", draw);
  const sized = new ResizeObserver(() => {
    const { clientWidth, clientHeight } = canvas;
    if (clientWidth === 0 || clientHeight === 0) return;
    renderer.setSize(clientWidth, clientHeight, false);
    camera.aspect = clientWidth / clientHeight;
    camera.updateProjectionMatrix();
    draw();
  });
  sized.observe(canvas);
  return {
    show(inputs, results) {
      empty(joint);
      fill(joint, inputs, results);
      controls.target.set(0.25, 0.7, 0);
      controls.update();
      draw();
    },
    turn(around, over) {
      const place = new Spherical().setFromVector3(camera.position.clone().sub(controls.target));
      place.theta += around;
      place.phi = Math.min(Math.PI - 0.1, Math.max(0.1, place.phi + over));
      camera.position.copy(new Vector3().setFromSpherical(place).add(controls.target));
      controls.update();
      draw();
    },
    close() {
      sized.disconnect();
      controls.dispose();
      empty(joint);
      renderer.dispose();
    },
  };
}

function createRenderer(canvas: HTMLCanvasElement): WebGLRenderer | null {
  // Asked first: three writes to the console when there is no WebGL.
  if (!document.createElement("canvas").getContext("webgl2")) return null;
  const renderer = new WebGLRenderer({ canvas, antialias: true, alpha: true });
  renderer.setPixelRatio(Math.min(2, window.devicePixelRatio));
  return renderer;
}

function empty(group: Group): void {
  for (const child of [...group.children]) {
    if (child instanceof Mesh) {
      child.geometry.dispose();
      (child.material as MeshStandardMaterial).dispose();
    }
    group.remove(child);
  }
}

/** Header and branch, scaled so that the header's diameter is the scene's unit. */
function fill(group: Group, inputs: SaddleCopeInputs, results: SaddleCopeResults): void {
  const steel = { metalness: 0.25, roughness: 0.55, side: DoubleSide };
  const header = new Mesh(headerGeometry(inputs), new MeshStandardMaterial({ ...steel, color: 0x6f8492 }));
  const branch = new Mesh(
    branchGeometry(inputs, results),
    new MeshStandardMaterial({ ...steel, color: 0xe3dfd0 }),
  );
  group.add(header, branch);
  group.scale.setScalar(1 / inputs.headerOd);
}
