import { clsx } from "clsx";
import type { FormEvent } from "react";
import { Link, NavLink } from "react-router";
import { Avatar } from "./avatar.tsx";
import { Mark } from "./mark.tsx";
import { Wordmark } from "./wordmark.tsx";

export type NavItem = { label: string; to: string };
export type HeaderViewer = { name: string; handle: string; avatar?: string };

type SiteHeaderProps = {
  links: NavItem[];
  viewer: HeaderViewer | null;
  /** The signed-in person's own pages. */
  viewerLinks?: NavItem[];
  signInTo: string;
  homeTo?: string;
  /** Where signing out is posted without JavaScript. */
  signOutAction?: string;
  /** Signs out in place instead. */
  onSignOut?: () => void;
  /** Unread things, said beside the person's name. */
  unread?: number;
};

const linkClass = "inline-flex min-h-11 items-center px-3 font-semibold no-underline! hover:text-chalk!";

/** A strip of plate over every page. The menus are `details`, so they open without JavaScript. */
export function SiteHeader(props: SiteHeaderProps) {
  const { links, viewer, viewerLinks = [], signInTo, homeTo = "/", unread = 0 } = props;
  return (
    <header data-chrome className="plate rounded-none! border-x-0! border-t-0! text-sm">
      <div className="page-width flex min-h-16 items-center gap-x-4">
        <Link
          to={homeTo}
          className="inline-flex min-h-11 items-center text-chalk! no-underline!"
          aria-label="Soapstone, front page"
        >
          <Wordmark />
        </Link>
        <nav aria-label="Site" className="ml-4 hidden flex-1 md:block">
          <ul className="flex">
            {links.map((link) => (
              <li key={link.to}>
                <HeaderLink link={link} />
              </li>
            ))}
          </ul>
        </nav>
        <div className="ml-auto flex items-center">
          {viewer ? (
            <ViewerMenu
              viewer={viewer}
              links={viewerLinks}
              signOutAction={props.signOutAction}
              onSignOut={props.onSignOut}
              unread={unread}
            />
          ) : (
            <Link to={signInTo} className={clsx(linkClass, "text-chalk!")}>
              Sign in
            </Link>
          )}
          <details name="site-menu" className="group md:hidden">
            <summary className="flex size-11 list-none items-center justify-center rounded [&::-webkit-details-marker]:hidden">
              <span className="sr-only">Site menu</span>
              <MenuMark />
            </summary>
            <nav
              aria-label="Site"
              className="absolute inset-x-0 top-16 z-40 border-b border-plate-line bg-plate px-1 py-2 shadow-lifted"
            >
              <ul>
                {links.map((link) => (
                  <li key={link.to} className="border-b border-plate-line last:border-b-0">
                    <HeaderLink link={link} wide />
                  </li>
                ))}
              </ul>
            </nav>
          </details>
        </div>
      </div>
    </header>
  );
}

function HeaderLink({ link, wide = false }: { link: NavItem; wide?: boolean }) {
  return (
    <NavLink
      to={link.to}
      className={({ isActive }) =>
        clsx(
          linkClass,
          wide && "w-full",
          isActive ? "text-chalk!" : "text-chalk-soft!",
          isActive && !wide && "chalk-stroke",
        )
      }
    >
      {link.label}
    </NavLink>
  );
}

type ViewerMenuProps = {
  viewer: HeaderViewer;
  links: NavItem[];
  signOutAction: string | undefined;
  onSignOut: (() => void) | undefined;
  unread: number;
};

function ViewerMenu({ viewer, links, signOutAction, onSignOut, unread }: ViewerMenuProps) {
  const handleSignOut = (event: FormEvent) => {
    if (!onSignOut) return;
    event.preventDefault();
    onSignOut();
  };
  return (
    <details name="site-menu" className="relative">
      <summary className="flex min-h-11 list-none items-center gap-2 rounded px-1 font-semibold [&::-webkit-details-marker]:hidden">
        <Avatar name={viewer.name} src={viewer.avatar} size="small" />
        <span className="max-w-40 truncate max-sm:sr-only">{viewer.name}</span>
        {unread > 0 ? (
          <span className="inline-flex items-center gap-1 text-xs text-straw">
            <Mark shape="dot" className="size-3" />
            {unread}
            <span className="sr-only"> unread</span>
          </span>
        ) : null}
      </summary>
      <div className="absolute top-full right-0 z-40 mt-2.5 min-w-56 rounded border border-plate-line bg-plate-raised p-2 shadow-lifted">
        <p className="px-3 py-1 text-xs text-chalk-soft">@{viewer.handle}</p>
        <ul>
          {links.map((link) => (
            <li key={link.to}>
              <HeaderLink link={link} wide />
            </li>
          ))}
        </ul>
        {signOutAction ? (
          <form
            method="post"
            action={signOutAction}
            onSubmit={handleSignOut}
            className="mt-1 border-t border-plate-line pt-1"
          >
            <button type="submit" className={clsx(linkClass, "w-full cursor-pointer text-chalk-soft")}>
              Sign out
            </button>
          </form>
        ) : null}
      </div>
    </details>
  );
}

function MenuMark() {
  return (
    <svg
      viewBox="0 0 24 24"
      className="size-6"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.5"
      aria-hidden="true"
    >
      <path className="group-open:hidden" d="M3 6.5h18M3 12h13M3 17.5h18" />
      <path className="hidden group-open:block" d="m5 5 14 14M19 5 5 19" />
    </svg>
  );
}
