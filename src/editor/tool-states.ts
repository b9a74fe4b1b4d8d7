import type { Editor } from "@tiptap/core";
import { useEditorState } from "@tiptap/react";
import { allTools } from "./tools.ts";

/** Which tools are on at the caret, and which can be used there. */
export interface ToolStates {
  tools: Record<string, { active: boolean; enabled: boolean }>;
  inTable: boolean;
}

export function useToolStates(editor: Editor): ToolStates {
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
