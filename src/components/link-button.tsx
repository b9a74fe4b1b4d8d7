import { Link, type LinkProps } from "react-router";
import { type ButtonTone, buttonClass } from "./button-class.ts";

type LinkButtonProps = Omit<LinkProps, "className"> & { tone?: ButtonTone; className?: string };

/** Leads somewhere, looks like a button. Use `Button` for an act. */
export function LinkButton({ tone = "plain", className, ...rest }: LinkButtonProps) {
  return <Link {...rest} className={buttonClass(tone, className)} />;
}
