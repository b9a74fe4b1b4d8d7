import { zodResolver } from "@hookform/resolvers/zod";
import { Controller, useForm } from "react-hook-form";
import { z } from "zod";
import { displayName, type Me, unitPreference, updateProfileBody } from "#shared/contracts/people.ts";
import { Button } from "#src/components/button.tsx";
import { RadioGroup } from "#src/components/radio-group.tsx";
import { TextArea } from "#src/components/text-area.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useUpdateProfile } from "../queries.ts";
import { FormNotice } from "./form-notice.tsx";

const fields = z.object({
  name: displayName,
  bio: updateProfileBody.shape.bio.unwrap(),
  units: unitPreference,
});

type Fields = z.infer<typeof fields>;

const unitOptions = [
  { value: "mm", label: "Millimetres" },
  { value: "inch", label: "Inches", help: "Numbers are kept in millimetres and shown to you in inches." },
];

export function ProfileForm({ me }: { me: Me }) {
  const hydrated = useHydrated();
  const update = useUpdateProfile();
  const { name, bio, units } = me;
  const form = useForm<Fields>({ resolver: zodResolver(fields), defaultValues: { name, bio, units } });
  const { register, control, handleSubmit, setError, reset, formState } = form;
  const { errors, isDirty, isSubmitting } = formState;
  const submit = handleSubmit(async (values) => {
    try {
      const saved = await update.mutateAsync(values);
      reset({ name: saved.name, bio: saved.bio, units: saved.units });
      toasts.show({ kind: "success", message: "Your profile is saved." });
    } catch (error) {
      showErrors(error, setError, ["name", "bio"]);
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-6">
      <FormNotice message={errors.root?.message} />
      <TextField
        label="Display name"
        autoComplete="name"
        maxLength={60}
        error={errors.name?.message}
        {...register("name")}
      />
      <TextArea
        label="About you"
        optional
        help="A few lines on your page: your workshop, what you build. At most 600 characters."
        error={errors.bio?.message}
        {...register("bio")}
      />
      <Controller
        control={control}
        name="units"
        render={({ field }) => (
          <RadioGroup
            legend="Lengths are shown in"
            name={field.name}
            options={unitOptions}
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      <div>
        <Button
          type="submit"
          tone="primary"
          disabled={!hydrated || !isDirty}
          busy={isSubmitting}
          busyLabel="Saving…"
        >
          Save the profile
        </Button>
      </div>
    </form>
  );
}
