/** The temper colours by name; each has one meaning (see styles/tokens.css). */
export type Tone = "grey" | "straw" | "bronze" | "purple" | "temper" | "signal";

export const toneText: Record<Tone, string> = {
  grey: "text-grey",
  straw: "text-straw",
  bronze: "text-bronze",
  purple: "text-purple",
  temper: "text-temper",
  signal: "text-signal",
};

export const toneWash: Record<Tone, string> = {
  grey: "bg-grey-wash",
  straw: "bg-straw-wash",
  bronze: "bg-bronze-wash",
  purple: "bg-purple-wash",
  temper: "bg-temper-wash",
  signal: "bg-signal-wash",
};
