import { LinkButton } from "#src/components/link-button.tsx";
import { paths } from "#src/lib/paths.ts";
import { LiveWorking } from "./live-working.tsx";

/** What this is, shown by a working that works. */
export function WhatThisIs() {
  return (
    <section className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,18rem)_minmax(0,1fr)]">
      <div className="lg:sticky lg:top-8 lg:self-start">
        <h1>Build diaries with the numbers left in</h1>
        <p className="mt-5 font-serif text-base">
          People who make one-off machines write up each stage here and keep the sums in the text. This is one
          of them: the cut that seats one tube on another.{" "}
          <strong>Change a number and the drawing follows.</strong>
        </p>
        <p className="mt-3 font-serif text-base text-ink-soft">
          Every working in an entry is like it. Try your own tubes and print the template at full size.
        </p>
        <div className="mt-6 flex flex-wrap gap-2">
          <LinkButton tone="primary" to={paths.builds()}>
            Read a build
          </LinkButton>
          <LinkButton to={paths.signUp()}>Keep a diary of your own</LinkButton>
        </div>
      </div>
      <LiveWorking />
    </section>
  );
}

/** For whoever makes something and has read this far. */
export function ForBuilders() {
  return (
    <section aria-labelledby="for-builders" className="mt-16 border-t border-edge pt-6">
      <h2 id="for-builders">Making something?</h2>
      <p className="mt-3 max-w-measure font-serif text-base">
        Write it up as you go, from a phone if that is what is in the workshop. Put in photos, and work the
        sums where they belong. Reading needs no account; writing does.
      </p>
      <p className="mt-4">
        <LinkButton to={paths.signUp()}>Sign up</LinkButton>
      </p>
    </section>
  );
}
