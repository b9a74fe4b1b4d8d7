import Ellipsis from "lucide-react/icons/ellipsis";
import Keyboard from "lucide-react/icons/keyboard";
import { useState } from "react";
import { MoreSheet } from "./more-sheet.tsx";
import { ToolButton } from "./tool-button.tsx";
import { type ToolStates, useToolStates } from "./tool-states.ts";
import {
  allTools,
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
  const [more, setMore] = useState(false);
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
      <button
        type="button"
        {...stop("more")}
        aria-label="More tools"
        aria-haspopup="dialog"
        onClick={() => setMore(true)}
        className="editor-tool"
      >
        <Ellipsis aria-hidden="true" className="size-5" />
      </button>
      {more ? (
        <MoreSheet
          context={context}
          states={states}
          onTheBar={onTheBar}
          openHelp={openHelp}
          onClose={() => setMore(false)}
        />
      ) : null}
    </div>
  );
}
