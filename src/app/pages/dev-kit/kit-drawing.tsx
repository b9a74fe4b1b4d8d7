/** A worked drawing for the plate: a branch tube meeting its header, dimensioned. */
export function KitDrawing() {
  return (
    <svg viewBox="0 0 480 270" role="img" aria-label="A branch tube meets a header at 55 degrees">
      <g className="line-outline">
        <path d="M40 196h400M40 236h400M40 196v40M440 196v40" />
        <path d="m178 196 98-140m52 0-98 140" />
        <path d="m276 56 52 0" />
      </g>
      <g className="line-centre">
        <path d="M24 216h432M196 226 312 40" />
      </g>
      <g className="line-hidden">
        <path d="M178 196q20 26 52 0" />
      </g>
      <g className="line-dimension">
        <path d="M60 190v-34M178 190v-34M60 162h118" />
        <path d="m60 162 8-3v6zM178 162l-8-3v6z" fill="var(--color-chalk-soft)" />
        <path d="M262 216a60 60 0 0 0-26-48" />
        <path d="m236 168 8 2-4 6z" fill="var(--color-chalk-soft)" />
      </g>
      <g className="drawing-figure" fontSize="15">
        <text x="119" y="155" textAnchor="middle">
          118.0
        </text>
        <text x="266" y="190">
          55.0°
        </text>
        <text x="340" y="62">
          ⌀ 38.1
        </text>
        <text x="384" y="186">
          ⌀ 40.0
        </text>
      </g>
    </svg>
  );
}
