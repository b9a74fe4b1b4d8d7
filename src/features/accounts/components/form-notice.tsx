import type { ReactNode } from "react";
import { Notice } from "#src/components/notice.tsx";

/** What is wrong with a form as a whole. */
export function FormNotice({ message, actions }: { message: string | undefined; actions?: ReactNode }) {
  if (!message) return null;
  return (
    <Notice kind="error" title="That did not go through" role="alert" actions={actions}>
      {message}
    </Notice>
  );
}
