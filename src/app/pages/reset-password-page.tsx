import { useSearchParams } from "react-router";
import { ResetPassword } from "#src/features/accounts/components/reset-password.tsx";

export function Component() {
  const [search] = useSearchParams();
  return <ResetPassword token={search.get("token")} />;
}
