import { Extension } from "@tiptap/core";
import { NodeSelection } from "@tiptap/pm/state";
import { moveCurrentBlock } from "./block-commands.ts";
import { insertTools, type ToolContext, textTools } from "./tools.ts";

interface ShortcutOptions {
  /** Looked up when a key is pressed, since the page's handlers change as it renders. */
  context(): ToolContext | null;
  openHelp(): void;
  toRail(): void;
}

/** Keys that other extensions bring already. */
const builtIn = new Set([
  "Mod-b",
  "Mod-i",
  "Mod-e",
  "Mod-Shift-s",
  "Mod-Shift-b",
  "Mod-Shift-7",
  "Mod-Shift-8",
]);

/** The editor's own keys: putting blocks in, moving them, and getting from the text to the rail and back. */
export const Shortcuts = Extension.create<ShortcutOptions>({
  name: "shortcuts",
  // Before the table's and the lists' own keys, so that Escape always finds its way out.
  priority: 1000,
  addOptions: () => ({ context: () => null, openHelp: () => {}, toRail: () => {} }),
  addKeyboardShortcuts() {
    const { context, openHelp, toRail } = this.options;
    const move = (direction: "up" | "down") => () => {
      const tr = moveCurrentBlock(this.editor.state, direction);
      if (tr) this.editor.view.dispatch(tr);
      return true;
    };
    const own = [...insertTools, ...textTools].flatMap((tool) =>
      tool.keys && !builtIn.has(tool.keys) ? [[tool.keys, run(tool)] as const] : [],
    );
    function run(tool: (typeof insertTools)[number]) {
      return () => {
        const now = context();
        if (!now || tool.enabled?.(now.editor) === false) return false;
        tool.run(now);
        return true;
      };
    }
    return {
      ...Object.fromEntries(own),
      "Alt-Shift-ArrowUp": move("up"),
      "Alt-Shift-ArrowDown": move("down"),
      "Mod-/": () => {
        openHelp();
        return true;
      },
      Enter: () => enterBlock(this.editor.view.dom, this.editor.state.selection),
      Escape: () => {
        toRail();
        return true;
      },
    };
  },
});

/** Enter on a block that is picked as a whole goes to its first field. */
function enterBlock(root: HTMLElement, selection: unknown): boolean {
  if (!(selection instanceof NodeSelection)) return false;
  const field = root.querySelector<HTMLElement>(
    ".ProseMirror-selectednode :is(input, textarea, select, button):not(:disabled)",
  );
  field?.focus();
  return field !== null;
}
