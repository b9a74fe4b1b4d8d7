import type { EditorState, Transaction } from "@tiptap/pm/state";
import { NodeViewContent, NodeViewWrapper, type ReactNodeViewProps } from "@tiptap/react";
import type { PhotoAttributes, WorkingAttributes } from "#shared/document/types.ts";
import { dissolveGroup, joinPhotoAbove, moveNode, removePhoto, takePhotoOut } from "./block-commands.ts";
import { useNodeViews } from "./block-view-props.ts";

/** Runs a change on the node of a view, wherever it stands by now. */
function useNodeCommand({ editor, getPos }: ReactNodeViewProps) {
  return (change: (state: EditorState, pos: number) => Transaction | null | undefined) => {
    const pos = getPos();
    if (pos === undefined) return;
    const tr = change(editor.state, pos);
    if (tr) editor.view.dispatch(tr);
  };
}

export function PhotoNodeView(props: ReactNodeViewProps) {
  const { photo: View } = useNodeViews();
  const { editor, node, selected, updateAttributes, getPos } = props;
  const command = useNodeCommand(props);
  const pos = getPos() ?? 0;
  const inGroup = editor.state.doc.resolve(pos).parent.type.name === "photoGroup";
  const canJoin = joinPhotoAbove(editor.state, pos) !== null;
  return (
    <NodeViewWrapper className="editor-block not-prose" data-selected={selected || undefined}>
      <View
        attributes={node.attrs as PhotoAttributes}
        update={updateAttributes}
        remove={() => command(removePhoto)}
        move={(direction) => command((state, at) => moveNode(state, at, direction))}
        selected={selected}
        inGroup={inGroup}
        takeOut={() => command(takePhotoOut)}
        joinAbove={canJoin ? () => command(joinPhotoAbove) : null}
      />
    </NodeViewWrapper>
  );
}

export function PhotoGroupNodeView(props: ReactNodeViewProps) {
  const { photoGroup: View } = useNodeViews();
  const command = useNodeCommand(props);
  return (
    <NodeViewWrapper className="editor-block not-prose" data-selected={props.selected || undefined}>
      <View
        count={props.node.childCount}
        remove={props.deleteNode}
        move={(direction) => command((state, at) => moveNode(state, at, direction))}
        dissolve={() => command(dissolveGroup)}
      >
        <NodeViewContent className="editor-photo-group" data-count={props.node.childCount} />
      </View>
    </NodeViewWrapper>
  );
}

export function WorkingNodeView(props: ReactNodeViewProps) {
  const { working: View } = useNodeViews();
  const command = useNodeCommand(props);
  return (
    <NodeViewWrapper className="editor-block not-prose" data-selected={props.selected || undefined}>
      <View
        attributes={props.node.attrs as WorkingAttributes}
        update={props.updateAttributes}
        remove={props.deleteNode}
        move={(direction) => command((state, at) => moveNode(state, at, direction))}
        selected={props.selected}
      />
    </NodeViewWrapper>
  );
}
