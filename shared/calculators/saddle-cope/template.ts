import type { TemplateNames, TemplateSheet } from "#shared/templates/sheet.ts";
import { wrapTemplate } from "#shared/templates/wrap.ts";
import { distanceFromAxis, joint, type SaddleCopeResults } from "./formula.ts";
import type { SaddleCopeInputs } from "./inputs.ts";

/** The wrap template of a cope, full size in mm: laid out as `wrapTemplate` says. */
export function copeTemplate(
  inputs: SaddleCopeInputs,
  results: SaddleCopeResults,
  names: TemplateNames,
): TemplateSheet {
  const tube = joint(inputs);
  const depth = (radius: number) => (around: number) =>
    distanceFromAxis(tube, radius, around) - results.tipFromAxis;
  const strip = wrapTemplate(
    {
      width: results.templateWidth,
      deepest: results.deepest,
      outside: depth(tube.r),
      bore: depth(tube.bore),
      quarters: [
        ["HEEL", results.heelDepth],
        ["90° SIDE", results.sideDepth.at90],
        ["TOE", results.toeDepth],
        ["270° SIDE", results.sideDepth.at270],
      ],
      about: [
        `${inputs.branchOd} × ${inputs.branchWall} on ${inputs.headerOd} mm`,
        `at ${inputs.angle}°, offset ${inputs.offset} mm, ${names.date}`,
      ],
    },
    names,
  );
  return {
    ...strip,
    facts: facts(inputs, results),
    instructions: [
      "Cut along the solid curve. The dashed line is the bore: for reference, do not cut it.",
      "Wrap it print outward, arrow toward the coped end, with both HEEL lines on the heel line of the tube.",
    ],
  };
}

function facts(inputs: SaddleCopeInputs, results: SaddleCopeResults) {
  return [
    { label: "Header", value: `${inputs.headerOd} mm` },
    { label: "Branch", value: `${inputs.branchOd} × ${inputs.branchWall} mm` },
    { label: "Angle", value: `${inputs.angle}°` },
    { label: "Offset", value: `${inputs.offset} mm` },
    { label: "Deepest cut", value: `${results.deepest.toFixed(1)} mm` },
    { label: "Wrap length", value: `${results.templateWidth.toFixed(1)} mm` },
    { label: "Paper", value: `${inputs.paperThickness} mm` },
  ];
}
