import type { ReactNode } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import type { KeptLetter, LetterLine } from "./letter-store.ts";

const styles = `
:root { color-scheme: light dark; --paper: #f1f1eb; --sheet: #fafaf6; --ink: #1b1f22; --soft: #4e565b; --line: #cdcec6; --link: #1c5787; --plate: #1f2a32; }
@media (prefers-color-scheme: dark) { :root { --paper: #14181a; --sheet: #1c2224; --ink: #e8e7e0; --soft: #aab2b5; --line: #343c40; --link: #86bae4; --plate: #0f1518; } }
* { box-sizing: border-box; }
body { margin: 0; background: var(--paper); color: var(--ink); font: 17px/1.5 Archivo, "Segoe UI", Roboto, Helvetica, Arial, sans-serif; }
header { background: var(--plate); color: #ecebe2; padding: 18px max(16px, calc(50vw - 29rem)); }
header p { margin: 0; }
header .name { font-weight: 700; font-size: 20px; }
header .what { color: #b3bec3; font-size: 15px; }
main { max-width: 60rem; margin: 0 auto; padding: 24px 16px 64px; }
h1 { font-size: 28px; line-height: 1.2; margin: 0 0 20px; overflow-wrap: anywhere; }
h2 { font-size: 18px; margin: 32px 0 10px; }
a { color: var(--link); }
a:focus-visible, summary:focus-visible { outline: 3px solid #a37700; outline-offset: 2px; }
ul.letters { list-style: none; margin: 0; padding: 0; border-top: 1px solid var(--line); }
ul.letters a { display: grid; gap: 0 24px; grid-template-columns: minmax(0, 1fr) auto; padding: 12px 4px; border-bottom: 1px solid var(--line); color: inherit; text-decoration: none; }
ul.letters a:hover { background: var(--sheet); }
ul.letters .subject { font-weight: 600; color: var(--link); overflow-wrap: anywhere; }
ul.letters .to { grid-column: 1; color: var(--soft); overflow-wrap: anywhere; }
time { color: var(--soft); font-size: 15px; font-variant-numeric: tabular-nums; }
dl { display: grid; grid-template-columns: auto minmax(0, 1fr); gap: 4px 16px; margin: 0 0 24px; }
dt { color: var(--soft); } dd { margin: 0; overflow-wrap: anywhere; }
.back { display: inline-flex; align-items: center; min-height: 44px; margin-bottom: 8px; }
iframe { display: block; width: 100%; height: 44rem; border: 1px solid var(--line); background: var(--sheet); }
ul.links { margin: 0; padding: 0; list-style: none; }
ul.links a { display: inline-flex; align-items: center; min-height: 44px; overflow-wrap: anywhere; }
pre { margin: 0; padding: 16px; background: var(--sheet); border: 1px solid var(--line); white-space: pre-wrap; overflow-wrap: anywhere; font: 15px/1.5 "Red Hat Mono", ui-monospace, monospace; }
summary { min-height: 44px; display: flex; align-items: center; cursor: pointer; font-weight: 600; }
details { margin-top: 24px; }
@media (max-width: 36rem) { ul.letters a { grid-template-columns: minmax(0, 1fr); } }
`;

function page(title: string, content: ReactNode): string {
  const html = renderToStaticMarkup(
    <html lang="en-GB">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="robots" content="noindex" />
        <title>{`${title} · Soapstone mail fake`}</title>
        <style>{styles}</style>
      </head>
      <body>
        <header>
          <p className="name">Mail fake</p>
          <p className="what">Letters stop here. Nothing is sent to anybody while the fakes are on.</p>
        </header>
        <main>{content}</main>
      </body>
    </html>,
  );
  return `<!doctype html>${html}`;
}

const moment = new Intl.DateTimeFormat("en-GB", {
  dateStyle: "medium",
  timeStyle: "medium",
  timeZone: "UTC",
});

function Sent({ at }: { at: Date | null }) {
  return at ? <time dateTime={at.toISOString()}>{moment.format(at)} UTC</time> : <span>no date</span>;
}

/** Every letter kept, newest first. */
export function listPage(letters: LetterLine[]): string {
  return page(
    "Letters",
    <>
      <h1>Letters</h1>
      {letters.length === 0 ? (
        <p>No letters yet. Sign up or ask for a new password, and the letter turns up here.</p>
      ) : (
        <ul className="letters">
          {letters.map(({ id, subject, to, at }) => (
            <li key={id}>
              <a href={`/dev/mail/${id}`}>
                <span className="subject">{subject}</span>
                <Sent at={at} />
                <span className="to">to {to}</span>
              </a>
            </li>
          ))}
        </ul>
      )}
    </>,
  );
}

/** One letter: its links, as HTML in a frame that runs nothing, as text, and its headers. */
export function letterPage(letter: KeptLetter): string {
  const links = [...new Set(letter.text.match(/https?:\/\/\S+/g) ?? [])];
  return page(
    letter.subject,
    <>
      <a className="back" href="/dev/mail">
        ← All letters
      </a>
      <h1>{letter.subject}</h1>
      <dl>
        <dt>To</dt>
        <dd>{letter.to}</dd>
        <dt>From</dt>
        <dd>{letter.from}</dd>
        <dt>Sent</dt>
        <dd>
          <Sent at={letter.at} />
        </dd>
      </dl>
      {links.length > 0 ? (
        <>
          <h2>Links in this letter</h2>
          <ul className="links">
            {links.map((link) => (
              <li key={link}>
                <a href={link}>{link}</a>
              </li>
            ))}
          </ul>
        </>
      ) : null}
      <h2>As HTML</h2>
      <iframe
        title="The letter as HTML"
        src={`/dev/mail/${letter.id}/html`}
        sandbox="allow-popups allow-popups-to-escape-sandbox"
      />
      <h2>As text</h2>
      <pre>{letter.text}</pre>
      <details>
        <summary>Headers</summary>
        <pre>{letter.headers.map(({ line }) => line).join("\n")}</pre>
      </details>
    </>,
  );
}

export function noSuchLetterPage(): string {
  return page(
    "No such letter",
    <>
      <h1>No such letter</h1>
      <p>
        It may have gone: the last 200 are kept. <a href="/dev/mail">See all letters</a>
      </p>
    </>,
  );
}
