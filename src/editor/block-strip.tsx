import ArrowDown from "lucide-react/icons/arrow-down";
import ArrowUp from "lucide-react/icons/arrow-up";
import GripVertical from "lucide-react/icons/grip-vertical";
import Trash from "lucide-react/icons/trash-2";
import type { ReactNode } from "react";

interface BlockStripProps {
  /** What the block is, for the buttons' names: "photo", "working". */
  what: string;
  children?: ReactNode;
  move(direction: "up" | "down"): void;
  remove(): void;
}

/** The strip over a block in the editor: what it is, and the buttons that move it or take it out. */
export function BlockStrip({ what, children, move, remove }: BlockStripProps) {
  return (
    <div className="no-print mb-1 flex flex-wrap items-center" contentEditable={false}>
      <span
        data-drag-handle=""
        title={`Drag the ${what} to another place`}
        className="grid size-8 cursor-grab place-content-center text-edge pointer-coarse:hidden"
      >
        <GripVertical aria-hidden="true" className="size-4" />
      </span>
      <div className="flex flex-auto flex-wrap items-center gap-1">{children}</div>
      <div className="ml-auto flex">
        <StripButton label={`Move the ${what} up`} onClick={() => move("up")}>
          <ArrowUp aria-hidden="true" className="size-5" />
        </StripButton>
        <StripButton label={`Move the ${what} down`} onClick={() => move("down")}>
          <ArrowDown aria-hidden="true" className="size-5" />
        </StripButton>
        <StripButton label={`Take the ${what} out`} onClick={remove}>
          <Trash aria-hidden="true" className="size-5" />
        </StripButton>
      </div>
    </div>
  );
}

interface StripButtonProps {
  label: string;
  onClick(): void;
  disabled?: boolean;
  children: ReactNode;
}

export function StripButton({ label, onClick, disabled = false, children }: StripButtonProps) {
  return (
    <button
      type="button"
      title={label}
      aria-label={label}
      aria-disabled={disabled || undefined}
      onClick={() => !disabled && onClick()}
      className="editor-tool"
    >
      {children}
    </button>
  );
}
