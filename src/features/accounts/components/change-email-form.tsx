import { zodResolver } from "@hookform/resolvers/zod";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useForm } from "react-hook-form";
import type { Me } from "#shared/contracts/people.ts";
import { Button } from "#src/components/button.tsx";
import { MeaningTag } from "#src/components/meaning-tag.tsx";
import { Notice } from "#src/components/notice.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { useApi } from "#src/lib/api.ts";
import { messageOf, showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { meQuery } from "#src/lib/viewer.ts";
import { changeEmail, sendVerification } from "../auth-client.ts";
import { type ChangeEmailFields, changeEmailFields } from "../fields.ts";
import { FormNotice } from "./form-notice.tsx";
import { MailFakeHint } from "./letter-sent.tsx";
import { PasswordField } from "./password-field.tsx";

export function ChangeEmailForm({ me }: { me: Me }) {
  const hydrated = useHydrated();
  const queryClient = useQueryClient();
  const { queryKey } = meQuery(useApi());
  const [sentTo, setSentTo] = useState<string | null>(null);
  const { register, handleSubmit, setError, reset, formState } = useForm<ChangeEmailFields>({
    resolver: zodResolver(changeEmailFields),
    defaultValues: { newEmail: "", password: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (values) => {
    if (values.newEmail.toLowerCase() === me.email) {
      setError("newEmail", { message: "That is your address already." }, { shouldFocus: true });
      return;
    }
    try {
      await changeEmail(values);
      setSentTo(values.newEmail);
      reset();
      await queryClient.invalidateQueries({ queryKey, exact: true });
    } catch (error) {
      showErrors(error, setError, ["newEmail", "password"]);
    }
  });
  return (
    <>
      <PresentAddress me={me} />
      {sentTo ? (
        <div className="flex flex-col gap-3">
          <Notice kind="success" title="A letter is on its way" role="status">
            Open the link in the letter to <span className="break-all">{sentTo}</span>.
            {me.emailVerified ? " Until then the address stays as it is. We told the old one too." : ""}
          </Notice>
          <MailFakeHint />
        </div>
      ) : null}
      <form onSubmit={submit} noValidate className="flex flex-col gap-5">
        <FormNotice message={errors.root?.message} />
        <TextField
          label="New e-mail address"
          type="email"
          autoComplete="email"
          error={errors.newEmail?.message}
          {...register("newEmail")}
        />
        <PasswordField
          label="Password"
          help="To be sure that it is you."
          autoComplete="current-password"
          error={errors.password?.message}
          {...register("password")}
        />
        <div>
          <Button type="submit" disabled={!hydrated} busy={isSubmitting} busyLabel="Sending the letter…">
            Change the address
          </Button>
        </div>
      </form>
    </>
  );
}

function PresentAddress({ me }: { me: Me }) {
  const hydrated = useHydrated();
  const resend = useMutation({ mutationFn: sendVerification });
  return (
    <div className="flex flex-col gap-3">
      <p className="flex flex-wrap items-center gap-x-3 gap-y-2">
        <strong className="break-all">{me.email}</strong>
        {me.emailVerified ? (
          <MeaningTag tone="temper" shape="stroke">
            Confirmed
          </MeaningTag>
        ) : (
          <MeaningTag tone="straw" shape="chisel">
            Not confirmed yet
          </MeaningTag>
        )}
      </p>
      {me.emailVerified ? null : (
        <div>
          <Button
            disabled={!hydrated}
            busy={resend.isPending}
            busyLabel="Sending the letter…"
            onClick={() => resend.mutate(me.email)}
          >
            Send the letter again
          </Button>
        </div>
      )}
      {resend.isSuccess ? (
        <Notice kind="success" role="status">
          A new letter is on its way.
        </Notice>
      ) : null}
      <FormNotice message={resend.error ? messageOf(resend.error) : undefined} />
    </div>
  );
}
