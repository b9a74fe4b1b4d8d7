import { Link } from "react-router";
import type { PersonSummary } from "#shared/contracts/people.ts";
import { paths } from "#src/lib/paths.ts";
import { Avatar } from "./avatar.tsx";

/** A person's picture and name, leading to their page. */
export function PersonLink({ person }: { person: PersonSummary }) {
  const picture = person.avatar?.webp[0]?.url;
  return (
    <Link
      to={paths.person(person.handle)}
      className="inline-flex min-h-11 items-center gap-2 font-sans text-sm font-semibold text-ink! no-underline! hover:underline!"
    >
      <Avatar name={person.name} size="small" {...(picture && { src: picture })} />
      {person.name}
    </Link>
  );
}
