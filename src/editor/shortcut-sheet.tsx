import { Dialog } from "#src/components/dialog.tsx";
import { isMac, keyNames } from "./key-names.ts";
import { historyTools, insertTools, textTools } from "./tools.ts";

const ways: readonly { name: string; keys: string }[] = [
  { name: "From the text to the tools, and back", keys: "Escape" },
  { name: "Into a photo or working that is picked", keys: "Enter" },
  { name: "Move the block up", keys: "Alt-Shift-ArrowUp" },
  { name: "Move the block down", keys: "Alt-Shift-ArrowDown" },
  { name: "Show this sheet", keys: "Mod-/" },
];

interface ShortcutSheetProps {
  open: boolean;
  onClose(): void;
}

/** Every key the editor knows, on one sheet. */
export function ShortcutSheet({ open, onClose }: ShortcutSheetProps) {
  return (
    <Dialog open={open} onOpenChange={(now) => !now && onClose()} title="Keyboard shortcuts">
      <ShortcutList title="Put in" items={insertTools} />
      <ShortcutList title="Text" items={textTools} />
      <ShortcutList title="Getting about" items={[...historyTools, ...ways]} />
      <p className="text-sm text-ink-soft">
        Typed at the start of a line: “## ” begins a heading, “- ” a list, “1. ” numbered steps, “&gt; ” a
        quote.
      </p>
    </Dialog>
  );
}

function ShortcutList({
  title,
  items,
}: {
  title: string;
  items: readonly { name: string; keys?: string }[];
}) {
  const mac = isMac();
  return (
    <section>
      <h3 className="mb-1 text-sm font-semibold">{title}</h3>
      <dl className="divide-y divide-hairline border-y border-hairline text-sm">
        {items.map(({ name, keys }) =>
          keys ? (
            <div key={name} className="flex items-center justify-between gap-4 py-1.5">
              <dt>{name}</dt>
              <dd className="flex gap-1">
                {keyNames(keys, mac).map((key) => (
                  <kbd key={key} className="editor-key">
                    {key}
                  </kbd>
                ))}
              </dd>
            </div>
          ) : null,
        )}
      </dl>
    </section>
  );
}
