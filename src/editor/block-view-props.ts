import { type ComponentType, createContext, type ReactNode, useContext } from "react";
import type { PhotoAttributes, WorkingAttributes } from "#shared/document/types.ts";

/** What a block's view in the editor is given to show and change itself. */
export interface BlockViewProps<Attributes> {
  attributes: Attributes;
  update(changes: Partial<Attributes>): void;
  remove(): void;
  /** Moves the block past its neighbour. */
  move(direction: "up" | "down"): void;
  /** True while the block is picked as a whole. */
  selected: boolean;
}

export interface PhotoViewProps extends BlockViewProps<PhotoAttributes> {
  inGroup: boolean;
  /** Takes the photo out of its group. */
  takeOut(): void;
  /** Puts the photo side by side with the photo or group just above it; null when there is none. */
  joinAbove: (() => void) | null;
}

export interface PhotoGroupViewProps {
  count: number;
  remove(): void;
  move(direction: "up" | "down"): void;
  /** Sets the photos one under the other again. */
  dissolve(): void;
  children: ReactNode;
}

/** How the blocks of features are shown in the editor. src/app fills this in, so that the editor knows no feature. */
export interface NodeViews {
  photo: ComponentType<PhotoViewProps>;
  photoGroup: ComponentType<PhotoGroupViewProps>;
  working: ComponentType<BlockViewProps<WorkingAttributes>>;
}

const NodeViewsContext = createContext<NodeViews | null>(null);

export const NodeViewsProvider = NodeViewsContext.Provider;

export function useNodeViews(): NodeViews {
  const views = useContext(NodeViewsContext);
  if (!views) throw new Error("A block is shown outside RichTextEditor");
  return views;
}
