import { isRouteErrorResponse, useRouteError } from "react-router";
import { paths } from "#src/lib/paths.ts";

interface Told {
  title: string;
  message: string;
}

function told(error: unknown): Told {
  if (!isRouteErrorResponse(error)) {
    return { title: "Something broke", message: "This page could not be shown. Try again in a moment." };
  }
  const message = (error.data as { message?: string } | null)?.message;
  if (error.status === 404) {
    return {
      title: "Nothing here",
      message: message ?? "There is no page at this address, or it was withdrawn.",
    };
  }
  if (error.status === 401) return { title: "Sign in first", message: "This page is for signed-in people." };
  if (error.status === 403)
    return { title: "Not yours to open", message: message ?? "You may not see this page." };
  return {
    title: "Something broke",
    message: message ?? "This page could not be shown. Try again in a moment.",
  };
}

/** Shown in place of a page that could not be loaded or drawn. */
export function ErrorPage() {
  const { title, message } = told(useRouteError());
  return (
    <div className="mx-auto max-w-xl px-4 py-24">
      <title>{`${title} · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <h1 className="font-sans text-3xl font-semibold">{title}</h1>
      <p className="mt-4">{message}</p>
      <p className="mt-8">
        <a className="text-temper underline" href={paths.home()}>
          Go to the front page
        </a>
      </p>
    </div>
  );
}
