import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "#src/components/button.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { paths } from "#src/lib/paths.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { resetPassword } from "../auth-client.ts";
import { newPasswordField } from "../fields.ts";
import { AuthFrame } from "./auth-frame.tsx";
import { FormNotice } from "./form-notice.tsx";
import { PasswordField } from "./password-field.tsx";

const fields = z.object({ newPassword: newPasswordField });

const askAgain = <LinkButton to={paths.forgotPassword()}>Ask for a new link</LinkButton>;

/** Where the link in the letter leads. */
export function ResetPassword({ token }: { token: string | null }) {
  const [done, setDone] = useState(false);
  return (
    <AuthFrame title="Set a new password">
      {done ? (
        <Notice
          kind="success"
          title="The new password is set"
          role="status"
          actions={
            <LinkButton to={paths.signIn()} tone="primary">
              Sign in
            </LinkButton>
          }
        >
          You were signed out on every device. Sign in with the new one.
        </Notice>
      ) : null}
      {!done && token ? <ResetForm token={token} onDone={() => setDone(true)} /> : null}
      {!done && !token ? (
        <Notice kind="error" title="The link is not whole" actions={askAgain}>
          Open it from the letter, or ask for a new one.
        </Notice>
      ) : null}
    </AuthFrame>
  );
}

function ResetForm({ token, onDone }: { token: string; onDone: () => void }) {
  const hydrated = useHydrated();
  const { register, handleSubmit, setError, formState } = useForm<{ newPassword: string }>({
    resolver: zodResolver(fields),
    defaultValues: { newPassword: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async ({ newPassword }) => {
    try {
      await resetPassword({ token, newPassword });
      onDone();
    } catch (error) {
      showErrors(error, setError, ["newPassword"]);
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <FormNotice message={errors.root?.message} actions={askAgain} />
      <PasswordField
        label="New password"
        help="At least 10 characters. A few words that do not belong together do well."
        autoComplete="new-password"
        error={errors.newPassword?.message}
        {...register("newPassword")}
      />
      <Button type="submit" tone="primary" disabled={!hydrated} busy={isSubmitting} busyLabel="Setting it…">
        Set the new password
      </Button>
    </form>
  );
}
