import { useForm } from "react-hook-form";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { TextArea } from "#src/components/text-area.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useUpdateBuild } from "../mutations.ts";

const mostAlt = 300;

/** Words in place of the cover, for whoever cannot see it. */
export function CoverAltForm({ build: { slug, coverAlt } }: { build: WorkshopBuild }) {
  const hydrated = useHydrated();
  const update = useUpdateBuild(slug);
  const { register, handleSubmit, setError, formState } = useForm<{ coverAlt: string }>({
    values: { coverAlt },
    resetOptions: { keepDirtyValues: true },
  });
  const submit = handleSubmit(async (values) => {
    try {
      await update.mutateAsync(values);
    } catch (error) {
      showErrors(error, setError, ["coverAlt"]);
    }
  });
  const { errors, isDirty } = formState;
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-3">
      {errors.root ? (
        <Notice kind="error" role="alert">
          {errors.root.message}
        </Notice>
      ) : null}
      <TextArea
        label="What the cover shows"
        help="Read out to whoever cannot see the photo. One sentence will do."
        rows={2}
        error={errors.coverAlt?.message}
        {...register("coverAlt", {
          setValueAs: (text: string) => text.trim(),
          maxLength: {
            value: mostAlt,
            message: `The description of the cover may be at most ${mostAlt} characters.`,
          },
        })}
      />
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button type="submit" disabled={!hydrated} busy={update.isPending} busyLabel="Saving…">
          Save the description
        </Button>
        <span className="text-xs text-ink-soft">
          {isDirty ? "Not saved yet" : coverAlt === "" ? "No description yet" : ""}
        </span>
      </div>
    </form>
  );
}
