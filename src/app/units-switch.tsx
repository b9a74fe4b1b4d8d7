import type { UnitPreference } from "#shared/contracts/people.ts";
import { type SettingChoice, SettingSwitch } from "#src/components/setting-switch.tsx";
import { useChangePageSettings, usePageSettings } from "#src/lib/page-settings.ts";

const units: SettingChoice<UnitPreference>[] = [
  { value: "mm", label: "mm" },
  { value: "inch", label: "inches" },
];

/** How lengths are shown to a signed-out reader; a signed-in person sets it in their account. */
export function UnitsSwitch() {
  const change = useChangePageSettings();
  return (
    <SettingSwitch
      legend="Lengths in"
      name="units"
      value={usePageSettings().units}
      choices={units}
      action="/units"
      onChoose={(next) => change({ units: next })}
    />
  );
}
