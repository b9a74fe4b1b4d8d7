import { Link } from "react-router";

type BreadcrumbsProps = { trail: { label: string; to: string }[]; here?: string };

export function Breadcrumbs({ trail, here }: BreadcrumbsProps) {
  return (
    <nav aria-label="Where this is">
      <ol className="flex flex-wrap items-center text-xs">
        {trail.map((step) => (
          <li
            key={step.to}
            className="flex items-center after:mx-2 after:text-edge after:content-['/'] last:after:hidden"
          >
            <Link to={step.to} className="inline-flex min-h-11 items-center md:min-h-6">
              {step.label}
            </Link>
          </li>
        ))}
        {here ? (
          <li aria-current="page" className="text-ink-soft">
            {here}
          </li>
        ) : null}
      </ol>
    </nav>
  );
}
