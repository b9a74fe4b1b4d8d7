import type { TemplateNames, TemplateSheet } from "#shared/templates/sheet.ts";
import type { Tiling } from "#shared/templates/tiling.ts";

/** Everything that goes on the pages of one printed template. */
export interface PrintedSheet {
  sheet: TemplateSheet;
  tiling: Tiling;
  names: TemplateNames;
  /** The calculator's name, over the names of the build. */
  heading: string;
  cautions: readonly string[];
}
