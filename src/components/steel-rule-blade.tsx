import { type Graduation, graduations, type RuleScale } from "./steel-rule-layout.ts";

const lengths: Record<Graduation["size"], number> = { day: 9, week: 16, month: 30 };

/** The steel itself: brushed face, engraved graduations along the top edge, a hanging hole at the end. */
export function SteelRuleBlade({ scale, top, height }: { scale: RuleScale; top: number; height: number }) {
  const marks = graduations(scale);
  const { width, perDay } = scale;
  const end = width - 1;
  const bottom = top + height;
  const face = `M1 ${top}H${end - 14}A14 14 0 0 1 ${end} ${top + 14}V${bottom - 14}A14 14 0 0 1 ${end - 14} ${bottom}H1z`;
  return (
    <svg aria-hidden="true">
      <path className="rule-face" d={face} />
      <path className="rule-brush" d={brushLines(width, top, height)} />
      <path className="rule-bevel-high" d={`M1 ${top + 1}H${end - 14}`} />
      <path className="rule-bevel-low" d={`M1 ${bottom - 1}H${end - 14}`} />
      <path className="rule-outline" d={face} />
      <circle className="rule-hole" cx={end - 18} cy={top + height / 2} r={7} />
      <path className="rule-engraved" d={strokes(marks, "day", top)} />
      <path className="rule-engraved" d={strokes(marks, "week", top)} />
      <path className="rule-engraved rule-engraved-month" d={strokes(marks, "month", top)} />
      {marks.map((mark) =>
        mark.label ? (
          <text
            key={mark.x}
            className={mark.size === "month" ? "rule-month" : "rule-week"}
            x={mark.x + (mark.size === "month" ? 5 : 0)}
            y={top + (mark.size === "month" ? 43 : 28)}
          >
            {mark.label}
          </text>
        ) : null,
      )}
      <text className="rule-division" x={end - 34} y={bottom - 9}>
        {perDay >= 3.5 ? "1 DIV = 1 DAY" : perDay >= 1.5 ? "1 DIV = 1 WEEK" : "1 DIV = 1 MONTH"}
      </text>
    </svg>
  );
}

function strokes(marks: Graduation[], size: Graduation["size"], top: number): string {
  return marks
    .filter((mark) => mark.size === size)
    .map((mark) => `M${mark.x} ${top}v${lengths[size]}`)
    .join("");
}

/** Long uneven scratches from the grinding belt; fixed steps, so that server and browser draw the same. */
function brushLines(width: number, top: number, height: number): string {
  const lines: string[] = [];
  for (let line = 1; line < 12; line += 1) {
    const y = top + (height / 12) * line + ((line * 7) % 3) - 1;
    for (let x = (line * 131) % 173; x < width - 40; x += 260 + ((line * 53) % 90)) {
      lines.push(`M${x} ${y}h${Math.min(90 + ((x * 7 + line * 29) % 120), width - 16 - x)}`);
    }
  }
  return lines.join("");
}
