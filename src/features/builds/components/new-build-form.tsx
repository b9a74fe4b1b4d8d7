import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { type CreateBuildBody, createBuildBody } from "#shared/contracts/builds.ts";
import { Button } from "#src/components/button.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useCreateBuild } from "../queries.ts";
import { BuildFields, type BuildValues, buildFieldNames } from "./build-fields.tsx";

/** Starts a build and tells where it is. */
export function NewBuildForm({ onCreated }: { onCreated: (slug: string) => void }) {
  const hydrated = useHydrated();
  const create = useCreateBuild();
  // No default texts: what was typed before the page came alive is then taken over.
  const { register, handleSubmit, setError, formState } = useForm<BuildValues, unknown, CreateBuildBody>({
    resolver: zodResolver(createBuildBody),
  });
  const submit = handleSubmit(async (values) => {
    try {
      const { slug } = await create.mutateAsync(values);
      onCreated(slug);
    } catch (error) {
      showErrors(error, setError, buildFieldNames);
    }
  });
  const { errors } = formState;
  return (
    <form onSubmit={submit} noValidate className="flex max-w-measure flex-col gap-6">
      {errors.root ? (
        <Notice kind="error" role="alert">
          {errors.root.message}
        </Notice>
      ) : null}
      <BuildFields register={register} errors={errors} />
      <div className="flex flex-wrap gap-2 max-sm:flex-col">
        <Button
          type="submit"
          tone="primary"
          disabled={!hydrated}
          busy={create.isPending}
          busyLabel="Starting the build…"
        >
          Start the build
        </Button>
        <LinkButton to={paths.workshop()}>Back to the workshop</LinkButton>
      </div>
    </form>
  );
}
