import type { ReactNode } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import { MemoryRouter } from "react-router";
import { describe, expect, it } from "vitest";
import { Button } from "#src/components/button.tsx";
import { DataTable } from "#src/components/data-table.tsx";
import { FormErrorSummary } from "#src/components/form-error-summary.tsx";
import { Photo } from "#src/components/photo.tsx";
import { placeholderBackground } from "#src/components/placeholder-background.ts";
import { SiteHeader } from "#src/components/site-header.tsx";
import { SteelRule } from "#src/components/steel-rule.tsx";
import { TextField } from "#src/components/text-field.tsx";

const render = (node: ReactNode) => renderToStaticMarkup(<MemoryRouter>{node}</MemoryRouter>);

const attribute = (markup: string, tag: string, name: string) =>
  markup.match(new RegExp(`<${tag}\\b[^>]*\\b${name}="([^"]*)"`))?.[1];

describe("TextField", () => {
  it("ties its label, unit, help and error to the input", () => {
    const markup = render(
      <TextField id="h" label="Ride height" unit="mm" help="On the wheels." error="Give a figure." />,
    );
    expect(attribute(markup, "label", "for")).toBe("h");
    const described = attribute(markup, "input", "aria-describedby")?.split(" ") ?? [];
    expect(described).toHaveLength(3);
    for (const id of described) expect(markup).toContain(`id="${id}"`);
    expect(attribute(markup, "input", "aria-invalid")).toBe("true");
  });

  it("is not marked invalid, nor described, without an error or help", () => {
    const markup = render(<TextField label="Title" />);
    expect(markup).not.toContain("aria-invalid");
    expect(markup).not.toContain("aria-describedby");
  });
});

describe("Button", () => {
  it("stays focusable while busy and says what is going on", () => {
    const markup = render(
      <Button busy busyLabel="Saving…">
        Save
      </Button>,
    );
    expect(attribute(markup, "button", "aria-busy")).toBe("true");
    expect(attribute(markup, "button", "aria-disabled")).toBe("true");
    expect(markup).not.toMatch(/\sdisabled(=|>)/);
    expect(markup).toContain("Saving…");
  });

  it("does not submit a form unless told to", () => {
    expect(attribute(render(<Button>Add</Button>), "button", "type")).toBe("button");
  });
});

describe("FormErrorSummary", () => {
  it("leads to each field", () => {
    const markup = render(<FormErrorSummary errors={[{ fieldId: "title", message: "Give a title." }]} />);
    expect(attribute(markup, "a", "href")).toBe("#title");
    expect(markup).toContain('role="alert"');
  });

  it("is nothing without errors", () => {
    expect(render(<FormErrorSummary errors={[]} />)).toBe("");
  });
});

describe("DataTable", () => {
  it("names its rows and columns and keeps units in the head", () => {
    const markup = render(
      <DataTable
        caption="Cut list"
        columns={[
          {
            key: "mark",
            head: "Piece",
            rowHead: true,
            cell: (row: { mark: string; mm: string }) => row.mark,
          },
          { key: "mm", head: "Length", unit: "mm", numeric: true, cell: (row) => row.mm },
        ]}
        rows={[{ mark: "H14", mm: "312.5" }]}
        rowKey={(row) => row.mark}
      />,
    );
    expect(markup.match(/scope="col"/g)).toHaveLength(2);
    expect(markup).toMatch(/<th scope="row"[^>]*>H14/);
    expect(markup.match(/>mm</g)).toHaveLength(1);
    expect(markup).toMatch(/<td[^>]*text-right[^>]*>312\.5/);
  });
});

describe("SteelRule", () => {
  const markup = render(
    <SteelRule
      label="Time line"
      from={Date.UTC(2026, 0, 5)}
      to={Date.UTC(2026, 5, 30)}
      ticks={[
        {
          date: Date.UTC(2026, 4, 30),
          number: "9",
          label: "Rack too high",
          href: "/e/9",
          kind: "overturned",
          backTo: Date.UTC(2026, 3, 6),
        },
        {
          date: Date.UTC(2026, 3, 6),
          number: "7",
          label: "Steering tray",
          href: "/e/7",
          kind: "entry",
          major: true,
        },
      ]}
      photos={[{ date: Date.UTC(2026, 3, 7), src: "/p.webp", alt: "The rack", href: "/e/7#p1" }]}
    />,
  );

  it("is a region the keyboard can scroll", () => {
    expect(markup).toMatch(/<section aria-label="Time line" tabindex="0"/i);
  });

  it("says the date and the state of each tick", () => {
    expect(markup).toContain('aria-label="9. Rack too high, 30 May 2026, overturned"');
    expect(markup).toContain('aria-label="7. Steering tray, 6 Apr 2026"');
  });

  it("gives the same entries as a list in order of date", () => {
    const list = markup.slice(markup.indexOf("<ol"));
    expect(list.indexOf("/e/7")).toBeGreaterThan(0);
    expect(list.indexOf("/e/9")).toBeGreaterThan(list.indexOf("/e/7"));
    expect(list).toContain("(overturned)");
  });
});

describe("Photo", () => {
  it("holds its place and offers the newer formats", () => {
    const markup = render(
      <Photo
        src="/p.webp"
        alt="A bead"
        width={1600}
        height={1067}
        sources={[{ type: "image/avif", files: [{ src: "/p-640.avif", width: 640 }] }]}
      />,
    );
    expect(attribute(markup, "img", "width")).toBe("1600");
    expect(attribute(markup, "img", "height")).toBe("1067");
    expect(attribute(markup, "source", "srcSet")).toBe("/p-640.avif 640w");
    expect(attribute(markup, "img", "loading")).toBe("lazy");
  });
});

describe("placeholderBackground", () => {
  it("is undefined for what is not a thumbhash", () => {
    expect(placeholderBackground("%%%")).toBeUndefined();
  });

  it("gives the average colour and four corners", () => {
    const background = placeholderBackground("3OcRJYB4d3h/iIeHeEh3eIhw+j2w");
    expect(background?.backgroundColor).toMatch(/^rgb\(\d+ \d+ \d+\)$/);
    expect(background?.backgroundImage.match(/radial-gradient/g)).toHaveLength(4);
  });
});

describe("SiteHeader", () => {
  const links = [{ label: "Builds", to: "/" }];

  it("offers to sign in to someone unknown", () => {
    expect(render(<SiteHeader links={links} viewer={null} signInTo="/sign-in" />)).toContain(
      'href="/sign-in"',
    );
  });

  it("shows a signed-in person's own pages and a way out, in a menu that needs no script", () => {
    const markup = render(
      <SiteHeader
        links={links}
        viewer={{ name: "Maren Holt", handle: "maren" }}
        viewerLinks={[{ label: "Settings", to: "/settings" }]}
        signInTo="/sign-in"
        signOutAction="/sign-out"
      />,
    );
    expect(markup).toMatch(/<details[^>]*>.*href="\/settings".*action="\/sign-out".*<\/details>/s);
    expect(markup).not.toContain("Sign in");
  });
});
