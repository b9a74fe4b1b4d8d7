import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { slug } from "#shared/contracts/common.ts";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { usePageSettings } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useUpdateBuild } from "../mutations.ts";

const addressBody = z.object({
  slug: z
    .string()
    .trim()
    .min(1, "The address is missing.")
    .max(80, "The address may be at most 80 characters.")
    .pipe(slug),
});

interface BuildAddressFormProps {
  slug: string;
  onMoved: (slug: string) => void;
}

/** The last part of the build's address. */
export function BuildAddressForm({ slug: present, onMoved }: BuildAddressFormProps) {
  const hydrated = useHydrated();
  const { siteUrl } = usePageSettings();
  const update = useUpdateBuild(present);
  const { register, handleSubmit, setError, watch, formState } = useForm<{ slug: string }>({
    resolver: zodResolver(addressBody),
    values: { slug: present },
  });
  const submit = handleSubmit(async ({ slug: wanted }) => {
    if (wanted === present) return;
    try {
      const { slug: moved } = await update.mutateAsync({ slug: wanted });
      onMoved(moved);
    } catch (error) {
      showErrors(error, setError, ["slug"]);
    }
  });
  const { errors, isDirty } = formState;
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-4">
      {errors.root ? (
        <Notice kind="error" role="alert">
          {errors.root.message}
        </Notice>
      ) : null}
      <TextField
        label="Last part of the address"
        help="Small letters, digits and single hyphens."
        autoCapitalize="none"
        autoComplete="off"
        spellCheck={false}
        className="figures"
        error={errors.slug?.message}
        {...register("slug")}
      />
      <p className="figures text-xs break-all text-ink-soft">
        {siteUrl}
        {paths.build(watch("slug"))}
      </p>
      {isDirty ? (
        <Notice kind="attention">
          The build moves to the new address. Links to the old one will lead there, so nobody lands on an
          empty page.
        </Notice>
      ) : null}
      <div>
        <Button
          type="submit"
          disabled={!hydrated || !isDirty}
          busy={update.isPending}
          busyLabel="Changing the address…"
        >
          Change the address
        </Button>
      </div>
    </form>
  );
}
