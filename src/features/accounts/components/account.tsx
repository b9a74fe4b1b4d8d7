import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { PageHeading } from "#src/components/page-heading.tsx";
import { useApi } from "#src/lib/api.ts";
import { meQuery } from "#src/lib/viewer.ts";
import { AvatarEditor } from "./avatar-editor.tsx";
import { ChangeEmailForm } from "./change-email-form.tsx";
import { ChangePasswordForm } from "./change-password-form.tsx";
import { ProfileForm } from "./profile-form.tsx";
import { SessionList } from "./session-list.tsx";

/** Everything a person can set about themselves. */
export function Account() {
  const { data: me } = useQuery({
    ...meQuery(useApi()),
    // A new picture is made ready by a job.
    refetchInterval: ({ state }) => (state.data?.avatar?.state === "processing" ? 1500 : false),
  });
  if (!me) return null;
  return (
    <div className="page-width py-10">
      <title>Account · Soapstone</title>
      <meta name="robots" content="noindex" />
      <PageHeading title="Account" purpose="How you appear here, and how you sign in." />
      <div className="flex flex-col gap-12">
        <Section id="profile" title="Profile" about="What others see of you.">
          <AvatarEditor me={me} />
          <ProfileForm me={me} />
        </Section>
        <Section
          id="email"
          title="E-mail address"
          about="For signing in and for letters from us. Nobody else sees it."
        >
          <ChangeEmailForm me={me} />
        </Section>
        <Section id="password" title="Password" about="Changing it signs out every other device.">
          <ChangePasswordForm email={me.email} />
        </Section>
        <Section
          id="sessions"
          title="Where you are signed in"
          about="Sign out what you do not know, and change the password."
        >
          <SessionList />
        </Section>
      </div>
    </div>
  );
}

interface SectionProps {
  id: string;
  title: string;
  about: string;
  children: ReactNode;
}

function Section({ id, title, about, children }: SectionProps) {
  return (
    <section
      aria-labelledby={id}
      className="grid gap-x-12 gap-y-6 border-hairline border-b pb-12 last:border-b-0 lg:grid-cols-[16rem_minmax(0,36rem)]"
    >
      <div>
        <h2 id={id} className="text-lg">
          {title}
        </h2>
        <p className="mt-2 text-ink-soft text-sm">{about}</p>
      </div>
      <div className="flex min-w-0 flex-col gap-8">{children}</div>
    </section>
  );
}
