import type { ReactNode } from "react";
import { Link } from "react-router";
import { type Scheme, SchemeSwitch } from "./scheme-switch.tsx";
import type { NavItem } from "./site-header.tsx";

type SiteFooterProps = {
  groups: { title: string; links: NavItem[] }[];
  scheme: Scheme;
  /** More settings, beside the colours. */
  settings?: ReactNode;
  /** Small print: credits, the demo's remark. */
  children?: ReactNode;
};

export function SiteFooter({ groups, scheme, settings, children }: SiteFooterProps) {
  return (
    <footer data-chrome className="graduated-edge mt-20 pt-4 text-sm">
      <div className="page-width py-10">
        <div className="grid grid-cols-2 gap-x-6 gap-y-8 lg:grid-cols-4 lg:gap-x-10">
          {groups.map((group) => (
            <nav key={group.title} aria-label={group.title}>
              <p className="mb-1 text-xs font-semibold text-ink-soft">{group.title}</p>
              <ul>
                {group.links.map((link) => (
                  <li key={link.to}>
                    <Link to={link.to} className="inline-flex min-h-11 items-center text-ink! md:min-h-8">
                      {link.label}
                    </Link>
                  </li>
                ))}
              </ul>
            </nav>
          ))}
        </div>
        <div className="mt-10 flex flex-wrap items-center justify-between gap-x-8 gap-y-3 border-t border-hairline pt-4">
          <div className="max-w-measure text-xs text-ink-soft">{children}</div>
          <div className="flex flex-wrap gap-x-8">
            {settings}
            <SchemeSwitch scheme={scheme} />
          </div>
        </div>
      </div>
    </footer>
  );
}
