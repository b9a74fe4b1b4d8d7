import { fileURLToPath } from "node:url";

/** What each picture shows, in words. They were rendered for this project: no real workshop, product or person. */
export const photoAlts = {
  "cope-90":
    "A dark steel tube with its saddle-coped end ground bright rests on a vee block a few centimetres short of the upright tube it will meet at a right angle, with white soapstone lines along both tubes.",
  "cope-angle":
    "A steel tube propped on wooden packers at roughly 55 degrees to an upright tube, its bright coped end clear of the upright and showing one deep and one shallow side, with soapstone lines along the tube.",
  "cope-unequal":
    "A slim tube with a shallow coped, bright-ground end points at the side of a tube of about twice its diameter that lies end-on to the camera on small wooden packers, centre lines chalked on both.",
  "template-wrap":
    "A white paper template with a curved edge and a printed curve is wrapped round a steel tube near its plain end and held with a strip of masking tape, on a wooden bench.",
  "tacked-node":
    "Four steel tubes meet at a node, held by small tack welds with rings of straw, purple and blue heat tint on the bright ground metal; a red magnetic square stands out of focus behind.",
  "wishbone-jig":
    "An A-shaped tube wishbone with bronze-bushed sleeves is held in a jig on a perforated steel table by pins, two red-handled toggle clamps and a large bolt through the flat plate at its outer end.",
  "upright-bench":
    "A machined wheel hub with five studs on its upright, one lug at the top and one lower down between the packing blocks and not in line with it, stands on steel packing blocks on a flat table with a straightedge and a yellow tape measure beside it.",
  "frame-side":
    "Side view of a bare tube spaceframe for a small single-seat car, standing on two wooden trestles in a timber shed with a bench, shelves and tools behind.",
  "frame-front":
    "Front three-quarter view of the bare tube frame on trestles in the shed, with an upper and lower wishbone, a coil-over and one wheel mocked up on one side.",
  "plate-slots":
    "A brushed steel plate bracket with two slots and a bolt and washer through one of them lies on a wooden bench beside an unmarked calliper-like gauge, a spare bolt, nut and washers.",
  offcuts:
    "A wooden crate packed with upright tube offcuts of several diameters, some cut square, some coped, with bright edges and patches of rust.",
  "weld-close":
    "Close view of a ripple-patterned fillet weld round a tube joint, with bands of blue, purple, bronze and straw heat tint on the ground steel either side.",
  gantry:
    "A small portable gantry in the shed: two steel A-frames on castors, a yellow I-beam across them and a chain hoist hanging from a trolley.",
  "trike-frame":
    "The bare tube frame of a cargo trike, propped on a wooden stand in the shed, with an open box frame over two spoked front wheels and no rear wheel fitted yet.",
  "redo-scrap":
    "On a scratched steel table, the cut-up pieces of a first wishbone lie by a chalk cross and a hacksaw, next to the finished new wishbone.",
  "shed-door":
    "View into a timber garden-shed workshop with a steel table and vice, a long bench, shelves and tools on the wall, and daylight from a window falling on the concrete floor.",
  "avatar-nut": "A large steel hexagon nut on a scratched metal surface.",
  "avatar-punch": "A centre-punch mark where two scribed lines cross on blue layout-dyed metal.",
  "avatar-coil": "A small tied coil of copper-coloured wire on a wooden bench.",
} as const;

export type PhotoName = keyof typeof photoAlts;

export const photoNames = Object.keys(photoAlts) as PhotoName[];

/** Where a picture lies on disk. */
export const photoFile = (name: PhotoName): string =>
  fileURLToPath(new URL(`./photos/${name}.jpg`, import.meta.url));
