import { Outlet, ScrollRestoration } from "react-router";

/** Header, page and footer. */
export function Layout() {
  return (
    <>
      <main id="content">
        <Outlet />
      </main>
      <ScrollRestoration />
    </>
  );
}
