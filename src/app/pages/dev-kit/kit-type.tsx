const steps = [
  ["text-2xl", "The short arm was coped at the wrong clock"],
  ["text-xl", "Front suspension, laid out again"],
  ["text-lg", "What the first pair taught"],
  [
    "text-base font-serif",
    "Both wishbones hang from an upright that was measured on the bench, not from the drawing.",
  ],
  ["text-sm", "Set the branch tube, the header tube and the angle between them."],
  ["text-xs", "Measured with a straightedge and two feeler gauges, 14 March 2026"],
] as const;

const swatches = [
  ["paper", "bg-paper"],
  ["paper-raised", "bg-paper-raised"],
  ["plate", "bg-plate"],
  ["chalk", "bg-chalk"],
  ["straw-fill", "bg-straw-fill"],
  ["straw", "bg-straw"],
  ["bronze", "bg-bronze"],
  ["purple", "bg-purple"],
  ["temper", "bg-temper"],
  ["grey", "bg-grey"],
  ["signal", "bg-signal"],
] as const;

export function KitType() {
  return (
    <div className="grid gap-10 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
      <div className="flex flex-col gap-5">
        {steps.map(([step, words]) => (
          <div key={step}>
            <p
              className={
                step === "text-2xl" || step === "text-xl" ? `${step} font-[650] [font-stretch:82%]` : step
              }
            >
              {words}
            </p>
            <p className="figures mt-1 text-xs text-ink-soft">{step}</p>
          </div>
        ))}
      </div>
      <ul className="grid grid-cols-3 content-start gap-3">
        {swatches.map(([name, ground]) => (
          <li key={name} className="text-xs">
            <div className={`h-14 rounded border border-hairline ${ground}`} />
            {name}
          </li>
        ))}
      </ul>
    </div>
  );
}
