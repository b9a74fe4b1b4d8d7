import { Dialog } from "#src/components/dialog.tsx";
import { ToolButton } from "./tool-button.tsx";
import type { ToolStates } from "./tool-states.ts";
import {
  cameraTool,
  historyTools,
  insertTools,
  type Tool,
  type ToolContext,
  tableActions,
  textTools,
} from "./tools.ts";

interface MoreSheetProps {
  context: ToolContext;
  states: ToolStates;
  /** Tools that stand on the bar already. */
  onTheBar: readonly string[];
  openHelp(): void;
  onClose(): void;
}

/** The tools that have no room on the phone's bar, on a sheet that comes up under the thumb. */
export function MoreSheet({ context, states, onTheBar, openHelp, onClose }: MoreSheetProps) {
  // The sheet hands the focus back as it closes; the tool acts after that.
  const use = (run: () => void) => {
    onClose();
    setTimeout(run, 50);
  };
  const rest = [...insertTools, ...textTools, ...historyTools].filter((tool) => !onTheBar.includes(tool.id));
  const button = (tool: Tool) => (
    <ToolButton
      key={tool.id}
      tool={tool}
      worded
      {...(states.tools[tool.id] ?? { active: false, enabled: true })}
      onClick={() => use(() => tool.run(context))}
    />
  );
  return (
    <Dialog open onOpenChange={(stays) => !stays && onClose()} title="More tools">
      {states.inTable ? (
        <section>
          <h3 className="mb-1 text-sm">This table</h3>
          <div className="grid grid-cols-2">
            {tableActions.map(({ label, run }) => (
              <button
                key={label}
                type="button"
                className="editor-tool editor-tool-worded"
                onClick={() => use(() => run(context.editor.chain().focus()).run())}
              >
                {label}
              </button>
            ))}
          </div>
        </section>
      ) : null}
      <div className="grid grid-cols-2">
        {[cameraTool, ...rest].map(button)}
        <button type="button" className="editor-tool editor-tool-worded" onClick={() => use(openHelp)}>
          Keyboard shortcuts
        </button>
      </div>
    </Dialog>
  );
}
