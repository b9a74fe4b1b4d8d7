import type { ReactNode } from "react";
import { darkScheme, style, tick } from "./letter-style.ts";

const ticks = Array.from({ length: 21 }, (_, place) => ({ place, tall: place % 5 === 0 }));

interface LetterFrameProps {
  title: string;
  /** The line that mail programs show beside the subject. */
  preview: string;
  children: ReactNode;
}

/** Head, sheet and foot of every letter. */
export function LetterFrame({ title, preview, children }: LetterFrameProps) {
  return (
    <html lang="en-GB">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <meta name="supported-color-schemes" content="light dark" />
        <title>{title}</title>
        <style>{darkScheme}</style>
      </head>
      <body className="paper" style={style.body}>
        <div data-skip-in-text="true" style={{ display: "none", maxHeight: 0, overflow: "hidden" }}>
          {preview}
        </div>
        <table role="presentation" cellPadding={0} cellSpacing={0} style={style.sheet}>
          <tbody>
            <tr>
              <td style={style.head}>
                <p style={style.name}>Soapstone</p>
                <div
                  aria-hidden="true"
                  data-skip-in-text="true"
                  style={{ marginTop: "10px", height: "12px", lineHeight: 0 }}
                >
                  {ticks.map(({ place, tall }) => (
                    <span key={place} style={tick(tall)} />
                  ))}
                </div>
              </td>
            </tr>
            <tr>
              <td className="sheet" style={style.main}>
                <h1 style={style.title}>{title}</h1>
                {children}
              </td>
            </tr>
            <tr>
              <td className="sheet soft" style={style.foot}>
                Sent by Soapstone, where builds are kept with the numbers left in.
              </td>
            </tr>
          </tbody>
        </table>
      </body>
    </html>
  );
}

export function Paragraph({ children }: { children: ReactNode }) {
  return <p style={style.paragraph}>{children}</p>;
}

export function SmallPrint({ children }: { children: ReactNode }) {
  return (
    <p className="soft" style={style.small}>
      {children}
    </p>
  );
}

/** What the letter is for, as a button and once more as an address to copy. */
export function Act({ href, children }: { href: string; children: string }) {
  return (
    <>
      <div data-skip-in-text="true">
        <a className="act" href={href} target="_blank" rel="noreferrer" style={style.button}>
          {children}
        </a>
      </div>
      <SmallPrint>
        {children}:{" "}
        <a className="address" href={href} target="_blank" rel="noreferrer" style={style.address}>
          {href}
        </a>
      </SmallPrint>
    </>
  );
}
