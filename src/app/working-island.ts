import type { ComponentType } from "react";
import { islandSource } from "#src/lib/island.tsx";

interface PanelProps {
  calculator: string;
  title: string;
  inputs: Record<string, unknown>;
  units: "mm" | "inch";
}

const panel = Object.values(
  import.meta.glob<{ WorkingPanel: ComponentType<PanelProps> }>(
    "../features/workings/components/working-panel.tsx",
  ),
)[0];

/** The calculator as an island: whole in the page as it comes, alive when it nears the screen. */
export const workingPanel = islandSource<PanelProps>(
  async () => (await panel?.())?.WorkingPanel ?? (() => null),
);
