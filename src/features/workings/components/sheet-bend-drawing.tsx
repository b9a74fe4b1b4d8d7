import type { SheetBendResults } from "#shared/calculators/sheet-bend/formula.ts";
import type { SheetBendInputs } from "#shared/calculators/sheet-bend/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Figure, linePath, type Spot } from "./drawing-parts.tsx";
import { DrawingPair, DrawingSheet, fitted } from "./drawing-sheet.tsx";
import { placedWords } from "./placed-words.ts";
import { SheetFlat } from "./sheet-flat.tsx";
import { sheetProfile } from "./sheet-profile.ts";

const size = { width: 360, height: 320 };

/** The bent sheet from its edge, and the flat with its bend lines. */
export function SheetBendDrawing({
  inputs,
  results,
  units,
}: DrawingProps<SheetBendInputs, SheetBendResults>) {
  const show = (length: number) => lengthFigure(length, units, 1);
  return (
    <DrawingPair
      left={<BentSheet inputs={inputs} results={results} show={show} />}
      right={<SheetFlat inputs={inputs} results={results} show={show} />}
    />
  );
}

/** More flanges than this carry their numbers only: their lengths stand in the fields. */
const named = 6;

interface BentSheetProps {
  inputs: SheetBendInputs;
  results: SheetBendResults;
  show: (millimetres: number) => string;
}

function BentSheet({ inputs, results, show }: BentSheetProps) {
  const profile = sheetProfile(inputs, results);
  const { at } = fitted(profile.outline, { left: 62, top: 44, width: 236, height: 222 });
  const path = (spots: readonly Spot[]) => linePath(spots.map(([x, y]) => at(x, y)));
  const few = inputs.flanges.length <= named;
  const words = [
    ...profile.flanges.map((place, index) => ({
      ...place,
      at: at(...place.middle),
      text: few ? show(inputs.flanges[index] ?? 0) : `${index + 1}`,
      soft: false,
    })),
    ...profile.bends.map((place, index) => ({
      ...place,
      at: at(...place.middle),
      text: `${Math.abs(inputs.angles[index] ?? 0)}°`,
      soft: true,
    })),
  ];
  const sheet = profile.outline.map(([x, y]) => at(x, y));
  return (
    <DrawingSheet
      {...size}
      title="The bent sheet from its edge"
      description={`Flanges ${inputs.flanges.map(show).join(", ")}; bends ${inputs.angles.map((angle) => `${angle}°`).join(", ")}; thickness ${show(inputs.thickness)}, inside radius ${show(inputs.insideRadius)}.`}
    >
      <path
        className="line-outline"
        style={{ fill: "var(--color-grey-wash)" }}
        d={`${path(profile.outline)}Z`}
      />
      <path className="line-dimension" d={profile.tangents.map(path).join("")} />
      {placedWords(few ? words : words.slice(0, inputs.flanges.length), sheet, size).map(
        ({ at: spot, text, soft }) => (
          <Figure key={`${text} at ${spot}`} at={spot} anchor="middle" soft={soft}>
            {text}
          </Figure>
        ),
      )}
      <Figure at={[size.width / 2, size.height - 8]} anchor="middle" soft>
        {`${show(inputs.thickness)} sheet, inside R ${show(inputs.insideRadius)}`}
      </Figure>
    </DrawingSheet>
  );
}
