import { type SettingChoice, SettingSwitch } from "./setting-switch.tsx";

export type Scheme = "light" | "dark" | "system";

const schemes: SettingChoice<Scheme>[] = [
  { value: "system", label: "As the system" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
];

/** Light, dark, or as the device says. Takes effect on the whole page at once. */
export function SchemeSwitch({ scheme, action = "/scheme" }: { scheme: Scheme; action?: string }) {
  return (
    <SettingSwitch
      legend="Colours"
      name="scheme"
      value={scheme}
      choices={schemes}
      action={action}
      onChoose={(next) => {
        document.documentElement.dataset.scheme = next;
      }}
    />
  );
}
