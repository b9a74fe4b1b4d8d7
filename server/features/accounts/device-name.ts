/** Order matters: several browsers carry the names of others. */
const programs: [RegExp, string][] = [
  [/Edg(e|A|iOS)?\//, "Edge"],
  [/OPR\//, "Opera"],
  [/SamsungBrowser\//, "Samsung Internet"],
  [/Firefox\/|FxiOS\//, "Firefox"],
  [/Chrome\/|CriOS\//, "Chrome"],
  [/Safari\//, "Safari"],
];

const systems: [RegExp, string][] = [
  [/Android/, "Android"],
  [/iPhone/, "iPhone"],
  [/iPad/, "iPad"],
  [/Windows/, "Windows"],
  [/Mac OS X/, "Mac"],
  [/CrOS/, "ChromeOS"],
  [/Linux/, "Linux"],
];

/** What a person would call the device, from its user agent line: "Firefox on Android". */
export function deviceName(userAgent: string | null): string {
  const nameIn = (names: [RegExp, string][]) => names.find(([mark]) => mark.test(userAgent ?? ""))?.[1];
  const program = nameIn(programs);
  const system = nameIn(systems);
  if (!program && !system) return "Unknown device";
  return system ? `${program ?? "Browser"} on ${system}` : `${program}`;
}
