import { useQuery } from "@tanstack/react-query";
import { useRef, useState } from "react";
import { useParams } from "react-router";
import { findCalculator, runCalculator } from "#shared/calculators/registry.ts";
import type { WorkingAttributes } from "#shared/document/types.ts";
import { Notice } from "#src/components/notice.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { BlockStrip } from "#src/editor/block-strip.tsx";
import type { BlockViewProps, NodeViews } from "#src/editor/block-view-props.ts";
import { useOwnText } from "#src/editor/use-own-text.ts";
import { draftQuery } from "#src/features/entries/queries.ts";
import { EditorPhoto } from "#src/features/photos/components/editor-photo.tsx";
import { EditorPhotoGroup } from "#src/features/photos/components/editor-photo-group.tsx";
import { WorkingPanel } from "#src/features/workings/components/working-panel.tsx";
import { useApi } from "#src/lib/api.ts";
import { useUnits } from "#src/lib/page-settings.ts";

const longestTitle = 120;

/** A working in the editor: its title and the calculator itself. Only numbers that come out reach the draft. */
function EditorWorking({ attributes, update, remove, move }: BlockViewProps<WorkingAttributes>) {
  const { entry = "" } = useParams();
  const number = useWorkingNumber(entry, attributes.workingId);
  const units = useUnits();
  const [title, setTitle] = useOwnText(attributes.title, (text) => update({ title: text }));
  const { panelKey, handOn } = useOwnInputs(attributes.inputs, (inputs) => update({ inputs }));
  const run = runCalculator(attributes.calculator, attributes.inputs);
  const calculator = findCalculator(attributes.calculator);
  return (
    <div contentEditable={false}>
      <BlockStrip what="working" move={move} remove={remove}>
        <span className="px-2 text-xs font-semibold text-ink-soft">
          {number === null ? "Working, numbered once it is saved" : `Working W${number}`}
        </span>
      </BlockStrip>
      <TextField
        label="Title of the working"
        frameClassName="mb-3"
        optional
        value={title}
        placeholder={calculator?.name}
        error={
          title.length > longestTitle ? `The title may be at most ${longestTitle} characters.` : undefined
        }
        onChange={(event) => setTitle(event.target.value)}
      />
      {run.ok ? (
        <WorkingPanel
          key={panelKey}
          mode="edit"
          level={4}
          units={units}
          onInputsChange={handOn}
          working={{
            id: attributes.workingId,
            number,
            title: attributes.title,
            calculator: attributes.calculator,
            version: run.value.version,
            inputs: run.value.inputs,
            results: { ...run.value.results },
          }}
        />
      ) : (
        <Notice kind="error">
          These numbers do not come out. {run.issue.message} Take the working out and put in a new one.
        </Notice>
      )}
    </div>
  );
}

/** The number the server gave it, once a save has told. */
function useWorkingNumber(entry: string, workingId: string): number | null {
  const { data } = useQuery({
    ...draftQuery(useApi(), entry),
    select: ({ workings }) => workings[workingId]?.number ?? null,
  });
  return data ?? null;
}

/** The panel owns its numbers while they are typed; numbers from elsewhere, such as undo, start it afresh. */
function useOwnInputs(inputs: Record<string, unknown>, onChange: (inputs: Record<string, unknown>) => void) {
  const handedOn = useRef(inputs);
  const [panel, setPanel] = useState({ key: 0, inputs });
  if (inputs !== panel.inputs) {
    const foreign = JSON.stringify(inputs) !== JSON.stringify(handedOn.current);
    setPanel({ key: panel.key + (foreign ? 1 : 0), inputs });
  }
  const handOn = (next: Record<string, unknown>) => {
    handedOn.current = next;
    onChange(next);
  };
  return { panelKey: panel.key, handOn };
}

/** How the blocks of features are shown and changed while an entry is written. */
export const editorNodeViews: NodeViews = {
  photo: EditorPhoto,
  photoGroup: EditorPhotoGroup,
  working: EditorWorking,
};
