import { zodResolver } from "@hookform/resolvers/zod";
import { useQueryClient } from "@tanstack/react-query";
import { useForm } from "react-hook-form";
import { Button } from "#src/components/button.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { useApi } from "#src/lib/api.ts";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { changePassword } from "../auth-client.ts";
import { type ChangePasswordFields, changePasswordFields } from "../fields.ts";
import { sessionsQuery } from "../queries.ts";
import { FormNotice } from "./form-notice.tsx";
import { PasswordField } from "./password-field.tsx";

export function ChangePasswordForm({ email }: { email: string }) {
  const hydrated = useHydrated();
  const queryClient = useQueryClient();
  const { queryKey } = sessionsQuery(useApi());
  const { register, handleSubmit, setError, reset, formState } = useForm<ChangePasswordFields>({
    resolver: zodResolver(changePasswordFields),
    defaultValues: { password: "", newPassword: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async ({ password, newPassword }) => {
    try {
      await changePassword({ currentPassword: password, newPassword });
      reset();
      toasts.show({ kind: "success", message: "The password is changed. Other devices are signed out." });
      await queryClient.invalidateQueries({ queryKey });
    } catch (error) {
      showErrors(error, setError, ["password", "newPassword"]);
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <FormNotice message={errors.root?.message} />
      {/* Tells a password keeper whose password this is. */}
      <input type="text" name="username" autoComplete="username" value={email} readOnly hidden />
      <PasswordField
        label="Present password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register("password")}
      />
      <PasswordField
        label="New password"
        help="At least 10 characters. A few words that do not belong together do well."
        autoComplete="new-password"
        error={errors.newPassword?.message}
        {...register("newPassword")}
      />
      <div>
        <Button type="submit" disabled={!hydrated} busy={isSubmitting} busyLabel="Changing it…">
          Change the password
        </Button>
      </div>
    </form>
  );
}
