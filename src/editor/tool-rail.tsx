import type { Editor } from "@tiptap/core";
import { useEditorState } from "@tiptap/react";
import Ellipsis from "lucide-react/icons/ellipsis";
import Keyboard from "lucide-react/icons/keyboard";
import { Menu, type MenuEntry } from "#src/components/menu.tsx";
import { ToolButton } from "./tool-button.tsx";
import {
  allTools,
  cameraTool,
  historyTools,
  insertTools,
  type Tool,
  type ToolContext,
  tableActions,
  textTools,
} from "./tools.ts";
import { useRovingFocus } from "./use-roving-focus.ts";

interface ToolRailProps {
  context: ToolContext;
  openHelp(): void;
}

/** The rail of tools beside the text; on a phone a bar at the bottom edge, under the thumb. */
export function ToolRail({ context, openHelp }: ToolRailProps) {
  const states = useToolStates(context.editor);
  return (
    <>
      <WideRail context={context} states={states} openHelp={openHelp} />
      <ThumbBar context={context} states={states} openHelp={openHelp} />
    </>
  );
}

interface ToolStates {
  tools: Record<string, { active: boolean; enabled: boolean }>;
  inTable: boolean;
}

function useToolStates(editor: Editor): ToolStates {
  return useEditorState({
    editor,
    selector: ({ editor: now }) => ({
      tools: Object.fromEntries(
        allTools.map(({ id, active, enabled }) => [
          id,
          { active: active?.(now) ?? false, enabled: enabled?.(now) ?? true },
        ]),
      ),
      inTable: now.isActive("table"),
    }),
  });
}

function WideRail({ context, states, openHelp }: ToolRailProps & { states: ToolStates }) {
  const { onKeyDown, stop } = useRovingFocus("working");
  const button = (tool: Tool, worded: boolean) => (
    <ToolButton
      key={tool.id}
      tool={tool}
      worded={worded}
      {...(states.tools[tool.id] ?? { active: false, enabled: true })}
      {...stop(tool.id)}
      onClick={() => tool.run(context)}
    />
  );
  return (
    <div
      role="toolbar"
      aria-label="Tools"
      aria-orientation="vertical"
      onKeyDown={onKeyDown}
      className="editor-rail"
    >
      <p className="editor-rail-head">Put in</p>
      <div className="flex flex-col">{insertTools.map((tool) => button(tool, true))}</div>
      <p className="editor-rail-head">Text</p>
      <div className="grid grid-cols-3">{textTools.map((tool) => button(tool, false))}</div>
      {states.inTable ? <TableTools context={context} stop={stop} /> : null}
      <div className="mt-2 grid grid-cols-3 border-t border-hairline pt-2">
        {historyTools.map((tool) => button(tool, false))}
        <button
          type="button"
          {...stop("help")}
          title="Keys"
          aria-label="Show the keyboard shortcuts"
          onClick={openHelp}
          className="editor-tool"
        >
          <Keyboard aria-hidden="true" className="size-5" />
        </button>
      </div>
    </div>
  );
}

function TableTools({ context, stop }: { context: ToolContext; stop: (id: string) => object }) {
  return (
    <>
      <p className="editor-rail-head">This table</p>
      <div className="flex flex-col">
        {tableActions.map(({ label, run }) => (
          <button
            key={label}
            type="button"
            {...stop(label)}
            onMouseDown={(event) => event.preventDefault()}
            onClick={() => run(context.editor.chain().focus()).run()}
            className="editor-tool editor-tool-worded"
          >
            {label}
          </button>
        ))}
      </div>
    </>
  );
}

const onTheBar = ["photo", "working", "heading2", "bulletList", "bold", "caution"];

function ThumbBar({ context, states, openHelp }: ToolRailProps & { states: ToolStates }) {
  const { onKeyDown, stop } = useRovingFocus("photo");
  const tools = onTheBar.flatMap((id) => allTools.filter((tool) => tool.id === id));
  return (
    <div role="toolbar" aria-label="Tools" onKeyDown={onKeyDown} className="editor-thumb-bar">
      {tools.map((tool) => (
        <ToolButton
          key={tool.id}
          tool={tool}
          {...(states.tools[tool.id] ?? { active: false, enabled: true })}
          {...stop(tool.id)}
          onClick={() => tool.run(context)}
        />
      ))}
      <Menu
        label="More tools"
        entries={moreEntries(context, states, openHelp)}
        trigger={
          <button type="button" {...stop("more")} aria-label="More tools" className="editor-tool">
            <Ellipsis aria-hidden="true" className="size-5" />
          </button>
        }
      />
    </div>
  );
}

function moreEntries(context: ToolContext, states: ToolStates, openHelp: () => void): MenuEntry[] {
  const entry = (tool: Tool): MenuEntry => ({
    kind: "action",
    label: states.tools[tool.id]?.active ? `${tool.name} (on)` : tool.name,
    disabled: states.tools[tool.id]?.enabled === false,
    onSelect: () => afterMenu(() => tool.run(context)),
  });
  const rest = [...insertTools, ...textTools].filter((tool) => !onTheBar.includes(tool.id));
  const table: MenuEntry[] = tableActions.map(({ label, run }) => ({
    kind: "action",
    label,
    onSelect: () => afterMenu(() => run(context.editor.chain().focus()).run()),
  }));
  return [
    ...(states.inTable ? [...table, { kind: "separator" as const }] : []),
    entry(cameraTool),
    ...rest.map(entry),
    { kind: "separator" },
    ...historyTools.map(entry),
    { kind: "action", label: "Keyboard shortcuts", onSelect: openHelp },
  ];
}

/** The menu hands the focus back to its button as it closes; the tool acts after that. */
function afterMenu(run: () => void): void {
  setTimeout(run, 0);
}
