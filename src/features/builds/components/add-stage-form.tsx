import { useForm } from "react-hook-form";
import { Button } from "#src/components/button.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useAddStage } from "../mutations.ts";
import { stageTitleRules } from "../stage-title-rules.ts";

/** Adds a stage at the end; the field stays ready for the next one. */
export function AddStageForm({ slug, onAdded }: { slug: string; onAdded: (title: string) => void }) {
  const hydrated = useHydrated();
  const add = useAddStage(slug);
  const { register, handleSubmit, setError, setFocus, reset, formState } = useForm<{ title: string }>();
  const submit = handleSubmit(async ({ title }) => {
    try {
      await add.mutateAsync({ title });
      reset({ title: "" });
      setFocus("title");
      onAdded(title);
    } catch (error) {
      showErrors(error, setError, ["title"]);
    }
  });
  const { title, root } = formState.errors;
  return (
    <form onSubmit={submit} noValidate className="flex flex-col items-start gap-3">
      <TextField
        label="A new stage"
        help="A part of the build, such as the front suspension."
        autoComplete="off"
        frameClassName="w-full"
        error={title?.message ?? root?.message}
        {...register("title", stageTitleRules)}
      />
      <Button type="submit" disabled={!hydrated} busy={add.isPending} busyLabel="Adding…">
        Add the stage
      </Button>
    </form>
  );
}
