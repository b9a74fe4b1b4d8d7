import { ForgotPassword } from "#src/features/accounts/components/forgot-password.tsx";

export function Component() {
  return <ForgotPassword />;
}
