import fc from "fast-check";
import { createElement, Fragment } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { documentLimits } from "#shared/document/limits.ts";
import { validateDocument } from "#shared/document/validate.ts";
import { DocumentView } from "#src/editor/document-view.tsx";

const photoId = "0193a5b0-0000-7000-8000-000000000001";
const workingId = "0193a5b0-0000-7000-8000-000000000002";
const text = (words: string, marks?: unknown[]) => ({ type: "text", text: words, ...(marks && { marks }) });
const paragraph = (...content: unknown[]) => ({ type: "paragraph", content });
const doc = (...content: unknown[]) => ({ type: "doc", content });
const photo = (attrs = {}) => ({ type: "photo", attrs: { photoId, alt: "", caption: "", ...attrs } });
const working = (attrs = {}) => ({
  type: "working",
  attrs: { workingId, calculator: "saddle-cope", title: "", inputs: { branchOd: 42.4 }, ...attrs },
});
const link = (href: unknown, more = {}) =>
  doc(paragraph(text("here", [{ type: "link", attrs: { href, ...more } }])));

const issue = (json: unknown) => {
  const checked = validateDocument(json);
  return checked.ok ? null : checked.issue.message;
};

describe("validateDocument", () => {
  it("takes every block an entry can hold and fills in what was left out", () => {
    const cell = (type: string) => ({ type, attrs: { colspan: 1 }, content: [paragraph(text("44"))] });
    const checked = validateDocument(
      doc(
        { type: "heading", attrs: { level: 2 }, content: [text("Coping the lower arm")] },
        paragraph(text("Cut "), text("first", [{ type: "bold" }]), { type: "hardBreak" }, text("then fit")),
        {
          type: "orderedList",
          content: [{ type: "listItem", content: [paragraph(text("Mark the datum")), photo()] }],
        },
        { type: "blockquote", content: [paragraph(text("Measure it twice"))] },
        { type: "codeBlock", content: [text("G0 X10")] },
        { type: "table", content: [{ type: "tableRow", content: [cell("tableHeader"), cell("tableCell")] }] },
        { type: "caution", content: [paragraph(text("Wear a face shield"))] },
        { type: "horizontalRule" },
        { type: "photoGroup", content: [photo(), photo({ alt: null })] },
        working(),
      ),
    );
    expect(checked).toMatchObject({ ok: true });
    if (!checked.ok) return;
    expect(checked.value.content[2]).toMatchObject({ attrs: { start: 1 } });
    expect(checked.value.content[4]).toMatchObject({ attrs: { language: null } });
  });

  it("is content with its own answer", () => {
    const checked = validateDocument(
      doc({ type: "orderedList", content: [{ type: "listItem", content: [paragraph()] }] }),
    );
    expect(checked.ok && validateDocument(checked.value)).toEqual(checked);
  });

  it.each([9, 1, 0, "2", null])("refuses a heading of level %j", (level) => {
    expect(issue(doc({ type: "heading", attrs: { level }, content: [text("Frame")] }))).toContain(
      "level 2 or 3",
    );
  });

  it.each([
    "javascript:alert(1)",
    "JaVaScRiPt:alert(1)",
    " javascript:alert(1)",
    "java\tscript:alert(1)",
    "\u0001javascript:alert(1)",
    "data:text/html,<script>alert(1)</script>",
    "vbscript:x",
    "file:///etc/passwd",
    "//other.example/path",
    "/\\other.example",
    "\\\\other.example",
    "https://",
    "https:other",
    "builds/heron",
    "",
    null,
    7,
  ])("refuses a link to %j", (href) => {
    expect(issue(link(href))).not.toBeNull();
  });

  it.each([
    "https://example.org/a?b=c#d",
    "http://example.org",
    "mailto:maren@example.org",
    "/builds/heron",
    "/",
  ])("takes a link to %s", (href) => {
    expect(issue(link(href))).toBeNull();
  });

  it.each([{ target: "_blank" }, { rel: "opener" }, { class: "x" }, { onclick: "alert(1)" }])(
    "refuses a link that carries %j",
    (more) => {
      expect(issue(link("https://example.org", more))).not.toBeNull();
    },
  );

  it.each([
    ["an unknown node", doc({ type: "iframe" })],
    ["an unknown mark", doc(paragraph(text("a", [{ type: "blink" }])))],
    ["an unknown attribute", doc({ type: "paragraph", attrs: { style: "color:red" } })],
    ["an unknown property", doc({ type: "paragraph", html: "<script>" })],
    ["a node named after a property of every object", doc({ type: "constructor" })],
    ["text straight in the document", doc(text("loose"))],
    ["an empty document", doc()],
    ["a part of a document", paragraph(text("a"))],
    ["a photo without its file", doc(photo({ photoId: null }))],
    ["a photo's address in place of its id", doc(photo({ photoId: "https://other.example/x.png" }))],
    ["a group of one photo", doc({ type: "photoGroup", content: [photo()] })],
    [
      "a group of seven photos",
      doc({ type: "photoGroup", content: Array.from({ length: 7 }, () => photo()) }),
    ],
    ["a working twice", doc(working(), working())],
    ["a working inside a caution", doc({ type: "caution", content: [working()] })],
    [
      "a span of a thousand columns",
      doc({
        type: "table",
        content: [
          {
            type: "tableRow",
            content: [{ type: "tableCell", attrs: { colspan: 1000 }, content: [paragraph()] }],
          },
        ],
      }),
    ],
    [
      "a list that starts at half",
      doc({
        type: "orderedList",
        attrs: { start: 1.5 },
        content: [{ type: "listItem", content: [paragraph()] }],
      }),
    ],
    ["nothing", null],
    ["a number", 5],
    ["a list", []],
  ])("refuses %s", (_, json) => {
    expect(issue(json)).not.toBeNull();
  });

  it("refuses 20,000 nested quotes without running out of stack", () => {
    let nested: unknown = paragraph(text("deep"));
    for (let level = 0; level < 20_000; level += 1) nested = { type: "blockquote", content: [nested] };
    expect(issue(doc(nested))).toContain("nested too deeply");
  });

  it("refuses 20,000 nested lists inside a working's numbers", () => {
    let nested: unknown = 1;
    for (let level = 0; level < 20_000; level += 1) nested = [nested];
    expect(issue(doc(working({ inputs: { nested } })))).toContain("nested too deeply");
  });

  it("refuses more text than one entry may hold", () => {
    expect(issue(doc(paragraph(text("a".repeat(documentLimits.characters)))))).toContain("too long");
  });

  it("refuses more blocks than one entry may hold", () => {
    const many = Array.from({ length: documentLimits.values }, () => ({ type: "horizontalRule" }));
    expect(issue({ type: "doc", content: many })).toContain("too long");
  });

  it("refuses any JSON, or answers a document that renders without anything that runs", () => {
    let rendered = 0;
    fc.assert(
      fc.property(fc.oneof({ weight: 4, arbitrary: almostDocument }, fc.jsonValue()), (json) => {
        const checked = validateDocument(json);
        if (!checked.ok) {
          expect(checked.issue.message).not.toBe("");
          return;
        }
        rendered += 1;
        const html = renderToStaticMarkup(createElement(DocumentView, { document: checked.value, slots }));
        const tags = html.match(/<[^>]*>/g) ?? [];
        for (const tag of tags) {
          expect(tag).not.toMatch(/^<(script|iframe|object|embed|style|img|base|form)/i);
          expect(tag).not.toMatch(/\s(on\w+|style|srcdoc|formaction)\s*=/i);
          expect(tag).not.toMatch(/(href|src)="(?!https?:|mailto:|\/(?!\/))/i);
        }
      }),
      { numRuns: 600 },
    );
    expect(rendered).toBeGreaterThan(20);
  });
});

const hostile = fc.constantFrom(
  "<script>alert(1)</script>",
  '"><img src=x onerror=alert(1)>',
  "javascript:alert(1)",
  "' onmouseover='alert(1)",
  "&lt;script&gt;",
  'https://example.org/"onclick=alert(1)',
  "plain words",
);

const marks = fc.array(
  fc.oneof(
    fc.constantFrom("bold", "italic", "strike", "code", "script").map((type) => ({ type })),
    fc.record({ type: fc.constant("link"), attrs: fc.record({ href: fc.oneof(hostile, fc.webUrl()) }) }),
  ),
  { maxLength: 2 },
);

const attributes = fc.oneof(
  { weight: 3, arbitrary: fc.constant(undefined) },
  fc.record({ level: fc.integer({ min: 1, max: 4 }) }),
  fc.record({ language: hostile }),
  fc.record({ start: fc.integer({ min: -2, max: 9 }) }),
  fc.record({ photoId: fc.constant(photoId), alt: hostile, caption: hostile }),
  fc.record({
    workingId: fc.uuid(),
    calculator: fc.constant("saddle-cope"),
    title: hostile,
    inputs: fc.dictionary(hostile, hostile),
  }),
  fc.dictionary(fc.constantFrom("onclick", "style", "src", "__proto__"), hostile),
);

/** Documents that are nearly right, so that a fair part of them passes and reaches the renderer. */
const almostDocument = fc
  .letrec<{ leaf: unknown; block: unknown }>((tie) => ({
    leaf: fc.record({ type: fc.constant("text"), text: hostile, marks }),
    block: fc.oneof(
      { depthSize: "small", withCrossShrink: true },
      fc.record({
        type: fc.constantFrom("paragraph", "codeBlock"),
        content: fc.array(tie("leaf"), { maxLength: 2 }),
      }),
      fc.record({
        type: fc.constantFrom(
          "heading",
          "orderedList",
          "photo",
          "working",
          "horizontalRule",
          "codeBlock",
          "script",
        ),
        attrs: attributes,
      }),
      fc.record({
        type: fc.constantFrom("blockquote", "caution", "bulletList", "listItem", "photoGroup", "table"),
        content: fc.array(tie("block"), { minLength: 1, maxLength: 2 }),
      }),
    ),
  }))
  .block.map((block) => JSON.parse(JSON.stringify({ type: "doc", content: [block] })));

const slots = {
  photo: ({ alt, caption }: { alt: string | null; caption: string }) =>
    createElement("p", { title: alt }, caption),
  photoGroup: ({ photos }: { photos: unknown[] }) => createElement("p", null, photos.length),
  working: ({ title, inputs }: { title: string; inputs: object }) =>
    createElement(Fragment, null, title, JSON.stringify(inputs)),
};
