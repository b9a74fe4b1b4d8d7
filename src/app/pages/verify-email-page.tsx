import { useSearchParams } from "react-router";
import { VerifyEmail } from "#src/features/accounts/components/verify-email.tsx";

export function Component() {
  const [search] = useSearchParams();
  return (
    <VerifyEmail
      token={search.get("token")}
      confirmed={search.has("confirmed")}
      error={search.get("error")}
    />
  );
}
