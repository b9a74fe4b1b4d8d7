import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { type CreateBuildBody, createBuildBody } from "#shared/contracts/builds.ts";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useUpdateBuild } from "../mutations.ts";
import { offerUndo } from "../offer-undo.ts";
import { BuildFields, type BuildValues, buildFieldNames } from "./build-fields.tsx";

/** Title, purpose and status of a build. What was typed stays until it is saved. */
export function BuildDetailsForm({ build }: { build: WorkshopBuild }) {
  const hydrated = useHydrated();
  const update = useUpdateBuild(build.slug);
  const { title, purpose, status } = build;
  const saved: BuildValues = { title, purpose, status };
  const { register, handleSubmit, setError, reset, formState } = useForm<
    BuildValues,
    unknown,
    CreateBuildBody
  >({
    resolver: zodResolver(createBuildBody),
    values: saved,
    resetOptions: { keepDirtyValues: true },
  });
  const submit = handleSubmit(async (values) => {
    try {
      await update.mutateAsync(values);
      reset(values);
      offerUndo("The details are saved.", () => update.mutate(saved));
    } catch (error) {
      showErrors(error, setError, buildFieldNames);
    }
  });
  const { errors, isDirty } = formState;
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      {errors.root ? (
        <Notice kind="error" role="alert">
          {errors.root.message}
        </Notice>
      ) : null}
      <BuildFields register={register} errors={errors} />
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button type="submit" disabled={!hydrated} busy={update.isPending} busyLabel="Saving…">
          Save the details
        </Button>
        {isDirty ? <span className="text-xs text-ink-soft">Not saved yet</span> : null}
      </div>
    </form>
  );
}
