import { defineCalculator, type ResultField } from "../definition.ts";
import { tubeSection as compute } from "./formula.ts";
import { tubeSectionInputs } from "./inputs.ts";

const field = (
  name: string,
  label: string,
  unit: string,
  decimals: number,
  meaning: string,
): ResultField => ({
  name,
  label,
  unit,
  decimals,
  meaning,
});

/** Area, stiffness, strength and mass of a tube's section. */
export const tubeSection = defineCalculator({
  id: "tube-section",
  version: 1,
  name: "Tube section",
  purpose: "Find the area, stiffness and mass of a round, square or rectangular tube.",
  group: "Strength",
  words: [
    "section properties",
    "second moment of area",
    "section modulus",
    "tube weight",
    "box section",
    "hollow section",
  ],
  inputs: tubeSectionInputs,
  example: { shape: "square", side: 50, wall: 3 },
  compute,
  resultFields: [
    field("area", "Area", "mm²", 1, "Metal in the cut end."),
    field("massPerMetre", "Mass", "kg/m", 3, "For each metre of tube."),
    field("i", "Second moment", "mm⁴", 0, "About the strong axis: stiffness in bending."),
    field("iMinor", "Second moment, weak axis", "mm⁴", 0, "About the weak axis."),
    field("w", "Section modulus", "mm³", 0, "Elastic, strong axis: bending moment over this is the stress."),
    field("wMinor", "Section modulus, weak axis", "mm³", 0, "Elastic, weak axis."),
    field("wpl", "Plastic modulus", "mm³", 0, "Strong axis."),
    field("wplMinor", "Plastic modulus, weak axis", "mm³", 0, "Weak axis."),
    field("radiusOfGyration", "Radius of gyration", "mm", 2, "Strong axis."),
    field(
      "radiusOfGyrationMinor",
      "Radius of gyration, weak axis",
      "mm",
      2,
      "Weak axis: a strut buckles about this.",
    ),
    field("torsion", "Torsion constant", "mm⁴", 0, "Stiffness in twisting."),
    field("torsionModulus", "Torsion modulus", "mm³", 0, "Twisting moment over this is the stress."),
    field("surfacePerMetre", "Surface", "m²/m", 4, "To paint, for each metre of tube."),
  ],
  cautions: [
    "Nominal sizes: EN 10219 and EN 10210 let the wall be up to a tenth thinner. Measure what you have.",
    "This is a sum of the shape alone. It is not an approval of any use of the tube.",
  ],
  method: {
    formula: [
      "round: A = π/4·(D² − d²),  I = π/64·(D⁴ − d⁴),  W = 2I/D,  Wpl = (D³ − d³)/6,  It = 2I",
      "box: A = 2t·(B + H − 2t) − (4 − π)·(ro² − ri²)",
      "box: I = outside rectangle − inside rectangle, each less its four corners",
      "box: It = t³·h/3 + 2·K·Ah,  K = 2·Ah·t/h,  h and Ah along the middle of the wall",
      "cold-formed: ro = 2t, ri = t to 6 mm; 2.5t, 1.5t to 10 mm; 3t, 2t above.  hot-finished: ro = 1.5t, ri = t",
    ],
    explanation:
      "The strong axis is the one across the longer side. The corner radii are those the standards reckon their own tables with; a real corner may be a little tighter or rounder.",
    sources: ["EN 10219-2:2006, annex B (cold-formed).", "EN 10210-2:2006, annex A (hot-finished)."],
  },
});
