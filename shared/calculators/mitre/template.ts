import type { TemplateNames, TemplateSheet } from "#shared/templates/sheet.ts";
import { wrapTemplate } from "#shared/templates/wrap.ts";
import { type MitreResults, mitreFromAxis } from "./formula.ts";
import type { MitreInputs } from "./inputs.ts";

/** The wrap template of a mitre, full size in mm: laid out as `wrapTemplate` says, and the same for both tubes. */
export function mitreTemplate(
  inputs: MitreInputs,
  results: MitreResults,
  names: TemplateNames,
): TemplateSheet {
  const { od, wall, turn } = inputs;
  const depth = (radius: number) => (around: number) =>
    mitreFromAxis(turn, radius, around) - results.tipFromAxis;
  const strip = wrapTemplate(
    {
      width: results.templateWidth,
      deepest: results.deepest,
      outside: depth(od / 2),
      bore: depth(od / 2 - wall),
      quarters: [
        ["HEEL", results.heelDepth],
        ["90° SIDE", results.sideDepth.at90],
        ["TOE", results.toeDepth],
        ["270° SIDE", results.sideDepth.at270],
      ],
      about: [`${od} × ${wall} mm, both tubes`, `turn ${turn}°, saw ${results.cutAngle}°, ${names.date}`],
    },
    names,
  );
  return {
    ...strip,
    facts: [
      { label: "Tube", value: `${od} × ${wall} mm` },
      { label: "Turn", value: `${turn}°` },
      { label: "Saw angle", value: `${results.cutAngle}°` },
      { label: "Deepest cut", value: `${results.deepest.toFixed(1)} mm` },
      { label: "Wrap length", value: `${results.templateWidth.toFixed(1)} mm` },
      { label: "Paper", value: `${inputs.paperThickness} mm` },
    ],
    instructions: [
      "Cut along the solid curve. The dashed line is the bore: for reference, do not cut it.",
      "Wrap it print outward, arrow toward the cut end, HEEL on the inside of the corner. Do the same on the other tube.",
    ],
  };
}
