import { useMemo } from "react";
import { Outlet, ScrollRestoration, useLocation } from "react-router";
import { LiveRegion } from "#src/components/live-region.tsx";
import { SiteFooter } from "#src/components/site-footer.tsx";
import { type HeaderViewer, SiteHeader } from "#src/components/site-header.tsx";
import { SkipLink } from "#src/components/skip-link.tsx";
import { ToastRegion } from "#src/components/toast-region.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { usePageSettings } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { useViewer } from "#src/lib/viewer.ts";
import { PendingBar } from "./pending-bar.tsx";
import { UnitsSwitch } from "./units-switch.tsx";
import { useMenuClosing, usePageChange } from "./use-page-change.ts";

const siteLinks = [
  { label: "Builds", to: paths.builds() },
  { label: "Bench", to: paths.bench() },
];

/** Skip link, header, page and footer. */
export function Layout() {
  const title = usePageChange();
  useMenuClosing();
  return (
    <>
      <SkipLink />
      <PendingBar />
      <Header />
      <main id="content" tabIndex={-1} className="outline-none">
        <Outlet />
      </main>
      <Footer />
      <LiveRegion>{title}</LiveRegion>
      <ToastRegion />
      <ScrollRestoration />
    </>
  );
}

function Header() {
  const viewer = useViewer();
  const { pathname, search } = useLocation();
  const person = useMemo<HeaderViewer | null>(() => {
    if (!viewer) return null;
    const avatar = viewer.avatar?.webp[0]?.url;
    return { name: viewer.name, handle: viewer.handle, ...(avatar && { avatar }) };
  }, [viewer]);
  const ownLinks = viewer
    ? [
        { label: "Workshop", to: paths.workshop() },
        { label: "Your page", to: paths.person(viewer.handle) },
        { label: "Account", to: paths.account() },
      ]
    : [];
  return (
    <SiteHeader
      links={viewer ? [...siteLinks, { label: "Workshop", to: paths.workshop() }] : siteLinks}
      viewer={person}
      viewerLinks={ownLinks}
      signInTo={paths.signIn(pathname === "/" ? undefined : pathname + search)}
      signOutAction={paths.signOut()}
      onSignOut={signOut}
    />
  );
}

/** A fresh start at the front page: nothing of the signed-in person stays behind in the open tab. */
async function signOut(): Promise<void> {
  const response = await fetch("/api/auth/sign-out", {
    method: "POST",
    headers: { "Content-Type": "application/json" },
    body: "{}",
  }).catch(() => null);
  if (response?.ok) window.location.assign(paths.home());
  else
    toasts.show({
      kind: "error",
      message: "You could not be signed out. Check the connection and try again.",
    });
}

function Footer() {
  const { scheme, fakes } = usePageSettings();
  const viewer = useViewer();
  const you = viewer
    ? [
        { label: "Workshop", to: paths.workshop() },
        { label: "Account", to: paths.account() },
      ]
    : [
        { label: "Sign in", to: paths.signIn() },
        { label: "Sign up", to: paths.signUp() },
      ];
  const standIns = {
    title: "Stand-ins",
    links: [
      { label: "Letters sent", to: paths.mailFake() },
      { label: "Interface kit", to: paths.kit() },
    ],
  };
  return (
    <SiteFooter
      groups={[
        {
          title: "Read",
          links: [{ label: "Front page", to: paths.home() }, ...siteLinks, { label: "API", to: paths.api() }],
        },
        { title: "You", links: you },
        ...(fakes ? [standIns] : []),
      ]}
      scheme={scheme}
      settings={viewer ? null : <UnitsSwitch />}
    >
      A working is a sum, not an approval. Check it, follow local rules, and have an engineer, coded welder or
      inspector judge what people will ride in or stand under.
    </SiteFooter>
  );
}
