import type { SheetBendResults } from "#shared/calculators/sheet-bend/formula.ts";
import type { SheetBendInputs } from "#shared/calculators/sheet-bend/inputs.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";
import { staggered } from "./staggered.ts";

const width = 360;
const [left, long] = [16, 328];
const [top, tall] = [62, 84];

interface SheetFlatProps {
  inputs: SheetBendInputs;
  results: SheetBendResults;
  show: (millimetres: number) => string;
}

/** The flat sheet: each bend line measured from the one edge, the sheet that goes into the bend between dashed lines. */
export function SheetFlat({ inputs, results, show }: SheetFlatProps) {
  const at = (along: number) => left + (long * along) / results.flatLength;
  const words = results.bendLines.map(show);
  const rows = staggered(
    results.bendLines.map((line, index) => {
      const word = words[index] ?? "";
      const half = (word.length * 9) / 2 + 4;
      const middle = kept(at(line), word);
      return { from: middle - half, to: middle + half };
    }),
  );
  const deep = Math.max(...rows) + 1;
  const low = top + tall;
  const height = Math.max(250, low + 60 + deep * 22);
  return (
    <DrawingSheet
      width={width}
      height={height}
      title="The flat sheet"
      description={`Flat length ${show(results.flatLength)}. Bend lines from the left edge at ${words.join(", ")}.`}
    >
      <path
        className="line-outline"
        style={{ fill: "var(--color-grey-wash)" }}
        d={`${linePath([
          [left, top],
          [left + long, top],
          [left + long, low],
          [left, low],
        ])}Z`}
      />
      <path
        className="line-dimension"
        d={[left, left + long].map((x) => stroke(x, top - 4, x, top - 24)).join("")}
      />
      <Dimension
        from={[left, top - 18]}
        to={[left + long, top - 18]}
        text={`flat ${show(results.flatLength)}`}
        at={[width / 2, top - 27]}
      />
      {results.bendLines.map((line, index) => (
        <BendLine
          key={line}
          x={at(line)}
          half={at((results.bends[index]?.allowance ?? 0) / 2) - left}
          y={low + 26 + (rows[index] ?? 0) * 22}
          word={words[index] ?? ""}
        />
      ))}
      <Figure at={[width / 2, height - 8]} anchor="middle" soft>
        Bend lines from the left edge
      </Figure>
      {results.bendLines.length <= 4 ? <Ways inputs={inputs} results={results} at={at} /> : null}
    </DrawingSheet>
  );
}

/** One bend line with the sheet that goes into its bend, and its distance from the edge. */
function BendLine({ x, half, y, word }: { x: number; half: number; y: number; word: string }) {
  const low = top + tall;
  return (
    <>
      <path
        className="line-dimension"
        strokeDasharray="3 3"
        d={stroke(x - half, top, x - half, low) + stroke(x + half, top, x + half, low)}
      />
      <path className="line-centre" d={stroke(x, top - 8, x, y - 14)} />
      <Figure at={[kept(x, word), y]} anchor="middle">
        {word}
      </Figure>
    </>
  );
}

/** The middle of a word, moved in from the sheet's ends. */
function kept(x: number, word: string): number {
  const room = (word.length * 9) / 2 + 4;
  return Math.min(width - room, Math.max(room, x));
}

/** How far each bend turns, and which way, between the bend line and the next. */
function Ways({ inputs, results, at }: Omit<SheetFlatProps, "show"> & { at: (along: number) => number }) {
  return inputs.angles.map((angle, index) => {
    const half = (results.bends[index]?.allowance ?? 0) / 2;
    const line = results.bendLines[index] ?? 0;
    const next = results.bendLines[index + 1];
    const spot: Spot = [at(line + half) + 4, top + tall / 2 + 5];
    const end = next === undefined ? left + long : at(next - (results.bends[index + 1]?.allowance ?? 0) / 2);
    const words = `${angle > 0 ? "up" : "down"} ${Math.abs(angle)}°`;
    if (spot[0] + words.length * 9 > end - 3) return null;
    return (
      <Figure key={line} at={spot} soft>
        {words}
      </Figure>
    );
  });
}
