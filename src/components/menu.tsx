import { clsx } from "clsx";
import { DropdownMenu } from "radix-ui";
import type { ReactNode } from "react";
import { Link } from "react-router";

export type MenuEntry =
  | { kind: "link"; label: ReactNode; to: string }
  | { kind: "action"; label: ReactNode; onSelect: () => void; destructive?: boolean; disabled?: boolean }
  | { kind: "separator" };

type MenuProps = { trigger: ReactNode; entries: MenuEntry[]; label?: string };

const itemClass =
  "flex min-h-11 cursor-pointer items-center gap-2 rounded px-3 text-sm text-ink! no-underline! outline-none data-disabled:cursor-not-allowed data-disabled:opacity-55 data-highlighted:bg-temper-wash";

/** App pages only (Radix): never import from a public reading page. */
export function Menu({ trigger, entries, label }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="end"
          sideOffset={4}
          aria-label={label}
          className="z-50 min-w-52 rounded border border-edge bg-paper-raised p-1 shadow-lifted"
        >
          {entries.map((entry, index) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a menu's entries are fixed while it is open
            <MenuItem key={index} entry={entry} />
          ))}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

function MenuItem({ entry }: { entry: MenuEntry }) {
  if (entry.kind === "separator") return <DropdownMenu.Separator className="my-1 h-px bg-hairline" />;
  if (entry.kind === "link") {
    return (
      <DropdownMenu.Item asChild>
        <Link to={entry.to} className={itemClass}>
          {entry.label}
        </Link>
      </DropdownMenu.Item>
    );
  }
  return (
    <DropdownMenu.Item
      onSelect={entry.onSelect}
      disabled={entry.disabled}
      className={clsx(itemClass, entry.destructive && "text-signal! data-highlighted:bg-signal-wash!")}
    >
      {entry.label}
    </DropdownMenu.Item>
  );
}
