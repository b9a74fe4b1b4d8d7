import { clsx } from "clsx";

type AvatarProps = { name: string; src?: string; size?: "small" | "medium" | "large" };

const sizes = { small: "size-8 text-xs", medium: "size-11 text-sm", large: "size-20 text-lg" };

/** A person's picture, or the first letters of the name. Says nothing itself: put the name beside it. */
export function Avatar({ name, src, size = "medium" }: AvatarProps) {
  const className = clsx("shrink-0 rounded", sizes[size]);
  if (src) {
    return (
      <img
        src={src}
        alt=""
        width={80}
        height={80}
        loading="lazy"
        className={clsx(className, "object-cover")}
      />
    );
  }
  return (
    <span
      aria-hidden="true"
      className={clsx(className, "grid place-content-center bg-bronze-wash font-semibold text-bronze")}
    >
      {initials(name)}
    </span>
  );
}

function initials(name: string): string {
  const words = name.trim().split(/\s+/);
  const first = words[0]?.charAt(0) ?? "";
  const last = words.length > 1 ? (words.at(-1)?.charAt(0) ?? "") : "";
  return (first + last).toUpperCase();
}
