import { isRouteErrorResponse, useLocation, useRouteError } from "react-router";
import { buttonClass } from "#src/components/button-class.ts";
import { EmptyState } from "#src/components/empty-state.tsx";
import { ErrorState } from "#src/components/error-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { paths } from "#src/lib/paths.ts";

interface Told {
  title: string;
  message: string;
  /** What the person can do about it; the front page is offered in any case. */
  way?: "sign_in" | "again";
}

const broke: Told = {
  title: "Something broke",
  message: "This page could not be shown. Try again in a moment.",
  way: "again",
};

function told(error: unknown): Told {
  if (!isRouteErrorResponse(error)) return broke;
  const message = (error.data as { message?: string } | null)?.message;
  if (error.status === 404) {
    return {
      title: "Nothing here",
      message: message ?? "There is no page at this address, or it was withdrawn.",
    };
  }
  if (error.status === 401) {
    return { title: "Sign in first", message: "This page is for signed-in people.", way: "sign_in" };
  }
  if (error.status === 403) {
    return { title: "Not yours to open", message: message ?? "You may not see this page." };
  }
  return { ...broke, message: message ?? broke.message };
}

/** Shown in place of a page that could not be loaded or drawn. */
export function ErrorPage() {
  const { title, message, way } = told(useRouteError());
  const { pathname, search } = useLocation();
  const here = pathname + search;
  const State = way === "again" ? ErrorState : EmptyState;
  return (
    <div className="page-width pt-12">
      <title>{`${title} · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <h1 className="mb-6">{title}</h1>
      <State
        title={message}
        action={
          <>
            {way === "sign_in" ? (
              <LinkButton tone="primary" to={paths.signIn(here)}>
                Sign in
              </LinkButton>
            ) : null}
            {way === "again" ? (
              <a href={here} className={buttonClass("primary")}>
                Try again
              </a>
            ) : null}
            <LinkButton to={paths.home()}>Go to the front page</LinkButton>
            {way === undefined ? <LinkButton to={paths.builds()}>See all builds</LinkButton> : null}
          </>
        }
      >
        {null}
      </State>
    </div>
  );
}
