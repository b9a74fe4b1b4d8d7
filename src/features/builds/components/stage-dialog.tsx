import { useId, useState } from "react";
import { useForm } from "react-hook-form";
import type { StageState, StageView } from "#shared/contracts/builds.ts";
import { Button } from "#src/components/button.tsx";
import { Dialog } from "#src/components/dialog.tsx";
import { Notice } from "#src/components/notice.tsx";
import { SelectField } from "#src/components/select-field.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { messageOf, showErrors } from "#src/lib/form-errors.ts";
import { useChangeStage } from "../mutations.ts";
import { offerUndo } from "../offer-undo.ts";
import { stageTitleRules } from "../stage-title-rules.ts";
import { optionsOf, stageStateWords } from "../state-words.ts";
import { DeleteStage } from "./delete-stage.tsx";

interface StageDialogProps {
  slug: string;
  stage: StageView;
  onDeleted: (title: string) => void;
}

/** Names a stage, says how far it is, or deletes it. */
export function StageDialog({ slug, stage, onDeleted }: StageDialogProps) {
  const [open, setOpen] = useState(false);
  const formId = useId();
  const change = useChangeStage(slug);
  return (
    <Dialog
      title={`Stage: ${stage.title}`}
      open={open}
      onOpenChange={setOpen}
      trigger={
        <Button tone="quiet" className="px-2! max-sm:-ml-2" aria-label={`Change ${stage.title}`}>
          Change
        </Button>
      }
      actions={
        <>
          <Button onClick={() => setOpen(false)}>Cancel</Button>
          <Button type="submit" form={formId} tone="primary" busy={change.isPending} busyLabel="Saving…">
            Save the stage
          </Button>
        </>
      }
    >
      <StageForm id={formId} stage={stage} change={change} onSaved={() => setOpen(false)} />
      <DeleteStage slug={slug} stage={stage} onDeleted={onDeleted} />
    </Dialog>
  );
}

interface StageFormProps {
  id: string;
  stage: StageView;
  change: ReturnType<typeof useChangeStage>;
  onSaved: () => void;
}

function StageForm({ id, stage, change, onSaved }: StageFormProps) {
  const before = { title: stage.title, state: stage.state };
  const { register, handleSubmit, setError, formState } = useForm<{ title: string; state: StageState }>({
    defaultValues: before,
  });
  const putBack = () =>
    change.mutate(
      { id: stage.id, ...before },
      { onError: (error) => toasts.show({ kind: "error", message: messageOf(error) }) },
    );
  const submit = handleSubmit(async (values) => {
    try {
      await change.mutateAsync({ id: stage.id, ...values });
      onSaved();
      offerUndo(`${values.title}: ${stageStateWords[values.state].word.toLowerCase()}. Saved.`, putBack);
    } catch (error) {
      showErrors(error, setError, ["title", "state"]);
    }
  });
  const { title, state, root } = formState.errors;
  return (
    <form id={id} onSubmit={submit} noValidate className="flex flex-col gap-4">
      {root ? (
        <Notice kind="error" role="alert">
          {root.message}
        </Notice>
      ) : null}
      <TextField
        label="Name"
        autoComplete="off"
        error={title?.message}
        {...register("title", stageTitleRules)}
      />
      <SelectField
        label="State"
        options={optionsOf(stageStateWords)}
        error={state?.message}
        {...register("state")}
      />
    </form>
  );
}
