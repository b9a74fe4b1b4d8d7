import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "#src/components/button.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { showErrors } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { emailField } from "../fields.ts";
import { FormNotice } from "./form-notice.tsx";

const fields = z.object({ email: emailField });

interface EmailFormProps {
  /** What the button says. */
  action: string;
  send: (email: string) => Promise<void>;
  onSent: (email: string) => void;
}

/** Asks for an address and has a letter sent there. */
export function EmailForm({ action, send, onSent }: EmailFormProps) {
  const hydrated = useHydrated();
  const { register, handleSubmit, setError, formState } = useForm<{ email: string }>({
    resolver: zodResolver(fields),
    defaultValues: { email: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async ({ email }) => {
    try {
      await send(email);
      onSent(email);
    } catch (error) {
      showErrors(error, setError, ["email"]);
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
      <Button type="submit" tone="primary" disabled={!hydrated} busy={isSubmitting} busyLabel="Sending…">
        {action}
      </Button>
    </form>
  );
}
