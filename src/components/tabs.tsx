import { Tabs as Radix } from "radix-ui";
import type { ReactNode } from "react";

type TabsProps = {
  label: string;
  tabs: { value: string; label: ReactNode; content: ReactNode }[];
  defaultValue?: string;
  value?: string;
  onValueChange?: (value: string) => void;
};

/** App pages only (Radix): never import from a public reading page. */
export function Tabs({ label, tabs, defaultValue, value, onValueChange }: TabsProps) {
  const first = defaultValue ?? tabs[0]?.value;
  return (
    <Radix.Root
      {...(value === undefined ? { defaultValue: first } : { value })}
      onValueChange={onValueChange}
    >
      <Radix.List aria-label={label} className="flex gap-6 overflow-x-auto border-b border-hairline">
        {tabs.map((tab) => (
          <Radix.Trigger
            key={tab.value}
            value={tab.value}
            className="-mb-px min-h-11 cursor-pointer border-b-[3px] border-transparent py-2 font-semibold whitespace-nowrap text-ink-soft hover:text-ink focus-visible:outline-offset-[-3px] data-[state=active]:border-temper data-[state=active]:text-ink"
          >
            {tab.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map((tab) => (
        <Radix.Content key={tab.value} value={tab.value} className="pt-5">
          {tab.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}
