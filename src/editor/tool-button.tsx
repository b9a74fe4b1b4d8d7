import { clsx } from "clsx";
import type { ComponentProps } from "react";
import { ariaKeys, isMac, keyNames } from "./key-names.ts";
import type { Tool } from "./tools.ts";

type ToolButtonProps = ComponentProps<"button"> & {
  tool: Tool;
  active: boolean;
  enabled: boolean;
  /** Shows the tool's word beside its picture. */
  worded?: boolean;
};

/** One tool. It stays focusable while it cannot be used, so that the arrows never skip about. */
export function ToolButton({
  tool,
  active,
  enabled,
  worded = false,
  onClick,
  className,
  ...rest
}: ToolButtonProps) {
  const Icon = tool.icon;
  const mac = isMac();
  const hint = tool.keys ? `${tool.name} (${keyNames(tool.keys, mac).join(" ")})` : tool.name;
  return (
    <button
      {...rest}
      type="button"
      title={hint}
      aria-label={worded && tool.word === tool.name ? undefined : tool.name}
      aria-pressed={tool.active ? active : undefined}
      aria-disabled={!enabled || undefined}
      aria-keyshortcuts={tool.keys && ariaKeys(tool.keys, mac)}
      // The caret stays in the text while a tool is pressed.
      onMouseDown={(event) => event.preventDefault()}
      onClick={(event) => enabled && onClick?.(event)}
      className={clsx("editor-tool", worded && "editor-tool-worded", className)}
    >
      <Icon aria-hidden="true" className="size-5 shrink-0" />
      {worded ? <span>{tool.word}</span> : null}
    </button>
  );
}
