import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { passwordLimits } from "#shared/contracts/sessions.ts";
import { Button } from "#src/components/button.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { signUp } from "../auth-client.ts";
import { type SignUpFields, signUpFields } from "../fields.ts";
import { FormNotice } from "./form-notice.tsx";
import { PasswordField } from "./password-field.tsx";

interface SignUpFormProps {
  values: SignUpFields;
  onDone: (values: SignUpFields) => void;
}

export function SignUpForm({ values: defaultValues, onDone }: SignUpFormProps) {
  const hydrated = useHydrated();
  const { register, handleSubmit, setError, formState } = useForm<SignUpFields>({
    resolver: zodResolver(signUpFields),
    defaultValues,
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (values) => {
    try {
      const { name, email, newPassword } = values;
      await signUp({ name, email, password: newPassword });
      onDone(values);
    } catch (error) {
      showErrors(error, setError, ["name", "email", "newPassword"]);
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <FormNotice message={errors.root?.message} />
      <TextField
        label="Display name"
        help="Stands beside everything you publish. You can change it later."
        autoComplete="name"
        maxLength={60}
        error={errors.name?.message}
        {...register("name")}
      />
      <TextField
        label="E-mail address"
        help="For signing in and for letters from us. Nobody else sees it."
        type="email"
        autoComplete="username"
        error={errors.email?.message}
        {...register("email")}
      />
      <PasswordField
        label="Password"
        help={`At least ${passwordLimits.least} characters. A few words that do not belong together do well.`}
        autoComplete="new-password"
        error={errors.newPassword?.message}
        {...register("newPassword")}
      />
      <Button
        type="submit"
        tone="primary"
        disabled={!hydrated}
        busy={isSubmitting}
        busyLabel="Opening the account…"
      >
        Open the account
      </Button>
    </form>
  );
}
