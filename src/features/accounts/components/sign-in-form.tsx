import type { UseFormReturn } from "react-hook-form";
import { Link } from "react-router";
import { Button } from "#src/components/button.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { signIn } from "../auth-client.ts";
import type { SignInFields } from "../fields.ts";
import { FormNotice } from "./form-notice.tsx";
import { PasswordField } from "./password-field.tsx";

interface SignInFormProps {
  form: UseFormReturn<SignInFields>;
  onSignedIn: () => void;
}

export function SignInForm({ form, onSignedIn }: SignInFormProps) {
  const hydrated = useHydrated();
  const { register, handleSubmit, setError, formState } = form;
  const { errors, isSubmitting, isSubmitSuccessful } = formState;
  const submit = handleSubmit(async (values) => {
    try {
      await signIn(values);
      onSignedIn();
    } catch (error) {
      showErrors(error, setError, ["email", "password"]);
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <FormNotice message={errors.root?.message} />
      <TextField
        label="E-mail address"
        type="email"
        autoComplete="username"
        error={errors.email?.message}
        {...register("email")}
      />
      <div>
        <PasswordField
          label="Password"
          autoComplete="current-password"
          error={errors.password?.message}
          {...register("password")}
        />
        <Link to={paths.forgotPassword()} className="inline-flex min-h-11 items-center text-xs">
          Forgot the password?
        </Link>
      </div>
      <Button
        type="submit"
        tone="primary"
        disabled={!hydrated}
        busy={isSubmitting || (isSubmitSuccessful && !errors.root)}
        busyLabel="Signing in…"
      >
        Sign in
      </Button>
    </form>
  );
}
