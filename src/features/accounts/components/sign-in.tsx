import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { Link } from "react-router";
import { paths } from "#src/lib/paths.ts";
import { type SignInFields, signInFields } from "../fields.ts";
import { AuthFrame } from "./auth-frame.tsx";
import { DemoSignIns } from "./demo-sign-ins.tsx";
import { SignInForm } from "./sign-in-form.tsx";

export function SignIn({ onSignedIn }: { onSignedIn: () => void }) {
  const form = useForm<SignInFields>({
    resolver: zodResolver(signInFields),
    defaultValues: { email: "", password: "" },
  });
  const fillIn = ({ email, password }: SignInFields) => {
    form.reset({ email, password });
    form.setFocus("email");
  };
  return (
    <AuthFrame title="Sign in" aside={<DemoSignIns onChoose={fillIn} />}>
      <SignInForm form={form} onSignedIn={onSignedIn} />
      <p className="border-hairline border-t pt-5">
        New here? <Link to={paths.signUp()}>Open an account</Link>
      </p>
    </AuthFrame>
  );
}
