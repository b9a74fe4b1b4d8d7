const beforeUnit = /(\d) (?=(?:mm|cm|m|km|in|inch|inches|kg|g|N|kN|Nm|MPa|mm²|mm⁴|°C|%)(?![\p{L}\p{N}]))/gu;

/** A number and its unit stay on one line: "5 mm" never breaks between the two. */
export function keepUnits(text: string): string {
  return text.replace(beforeUnit, "$1\u00a0");
}
