import { describe, expect, it } from "vitest";
import { withoutBlankEnd } from "#src/editor/editor-handle.ts";
import { ariaKeys, keyNames } from "#src/editor/key-names.ts";
import { completeHref } from "#src/editor/link-dialog.tsx";

describe("completeHref", () => {
  it.each([
    ["example.org", "https://example.org"],
    ["example.org:8080/a?b=c", "https://example.org:8080/a?b=c"],
    [" https://example.org ", "https://example.org"],
    ["maren@example.org", "mailto:maren@example.org"],
    ["/builds/heron", "/builds/heron"],
    ["javascript:alert(1)", "javascript:alert(1)"],
    ["two words", "two words"],
  ])("reads %j as %j", (typed, href) => {
    expect(completeHref(typed)).toBe(href);
  });
});

describe("keyNames", () => {
  it("names the keys as they are printed on each keyboard", () => {
    expect(keyNames("Mod-Alt-2", false)).toEqual(["Ctrl", "Alt", "2"]);
    expect(keyNames("Mod-Alt-2", true)).toEqual(["Cmd", "Option", "2"]);
    expect(keyNames("Alt-Shift-ArrowUp", false)).toEqual(["Alt", "Shift", "↑"]);
    expect(ariaKeys("Mod-Shift-z", false)).toBe("Control+Shift+z");
  });
});

describe("withoutBlankEnd", () => {
  it("drops blank paragraphs at the end but keeps one that is all there is", () => {
    const blank = { type: "paragraph" };
    const rule = { type: "horizontalRule" };
    expect(withoutBlankEnd({ type: "doc", content: [blank, rule, blank, blank] }).content).toEqual([
      blank,
      rule,
    ]);
    expect(withoutBlankEnd({ type: "doc", content: [blank, blank] }).content).toEqual([blank]);
  });
});
