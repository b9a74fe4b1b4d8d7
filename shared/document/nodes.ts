import { type Extensions, mergeAttributes, Node } from "@tiptap/core";
import { Blockquote } from "@tiptap/extension-blockquote";
import { Heading } from "@tiptap/extension-heading";
import { Link } from "@tiptap/extension-link";
import { ListItem, OrderedList } from "@tiptap/extension-list";
import { Table, TableCell, TableHeader, TableRow } from "@tiptap/extension-table";
import { StarterKit } from "@tiptap/starter-kit";
import { isAllowedHref } from "./href.ts";

/** What may stand inside quotes, cautions and table cells: words, not pictures or tables. */
const plainBlocks = "(paragraph | bulletList | orderedList)+";

/** Levels 2 and 3 only: the entry's title is the page's level 1. Headings pasted from elsewhere are moved into these. */
const SectionHeading = Heading.extend({
  parseHTML: () => [
    { tag: "h1", attrs: { level: 2 } },
    { tag: "h2", attrs: { level: 2 } },
    { tag: "h3", attrs: { level: 3 } },
    { tag: "h4", attrs: { level: 3 } },
    { tag: "h5", attrs: { level: 3 } },
    { tag: "h6", attrs: { level: 3 } },
  ],
}).configure({ levels: [2, 3] });

/** A link keeps its address and nothing else; `rel` is decided where it is shown. */
const PlainLink = Link.extend({
  addAttributes: () => ({ href: { default: null } }),
}).configure({
  openOnClick: false,
  protocols: ["mailto"],
  defaultProtocol: "https",
  HTMLAttributes: {},
  isAllowedUri: (href) => isAllowedHref(href),
});

const NumberedList = OrderedList.extend({
  addAttributes: () => ({
    start: {
      default: 1,
      parseHTML: (element: HTMLElement) => Number.parseInt(element.getAttribute("start") ?? "1", 10) || 1,
      renderHTML: ({ start }) => (start === 1 ? {} : { start }),
    },
  }),
});

const cellAttributes = () => ({
  colspan: { default: 1 },
  rowspan: { default: 1 },
  colwidth: { default: null, parseHTML: () => null },
});

const TextTableCell = TableCell.extend({ content: plainBlocks, addAttributes: cellAttributes });
const TextTableHeader = TableHeader.extend({ content: plainBlocks, addAttributes: cellAttributes });

/** A caution of the trade: words set apart because what follows can hurt someone. */
export const CautionNode = Node.create({
  name: "caution",
  group: "block",
  content: plainBlocks,
  defining: true,
  parseHTML: () => [{ tag: "aside[data-caution]" }],
  renderHTML: ({ HTMLAttributes }) => ["aside", mergeAttributes(HTMLAttributes, { "data-caution": "" }), 0],
});

/** A photo with its description and caption. The defaults exist for ProseMirror; a saved photo always has its id. */
export const PhotoNode = Node.create({
  name: "photo",
  group: "block",
  draggable: true,
  addAttributes: () => ({
    photoId: dataAttribute("data-photo-id", null),
    alt: dataAttribute("data-alt", null),
    caption: dataAttribute("data-caption", ""),
  }),
  parseHTML: () => [{ tag: "figure[data-photo-id]" }],
  renderHTML: ({ HTMLAttributes }) => ["figure", HTMLAttributes],
});

/** Two to six photos shown side by side. */
export const PhotoGroupNode = Node.create({
  name: "photoGroup",
  group: "block",
  content: "photo{2,6}",
  draggable: true,
  isolating: true,
  parseHTML: () => [{ tag: "div[data-photo-group]" }],
  renderHTML: ({ HTMLAttributes }) => ["div", mergeAttributes(HTMLAttributes, { "data-photo-group": "" }), 0],
});

/** A calculator with its inputs, kept and shown. */
export const WorkingNode = Node.create({
  name: "working",
  group: "block",
  draggable: true,
  addAttributes: () => ({
    workingId: dataAttribute("data-working-id", null),
    calculator: dataAttribute("data-calculator", null),
    title: dataAttribute("data-title", ""),
    inputs: {
      default: {},
      parseHTML: (element: HTMLElement) => parseInputs(element.getAttribute("data-inputs")),
      renderHTML: ({ inputs }) => ({ "data-inputs": JSON.stringify(inputs) }),
    },
  }),
  parseHTML: () => [{ tag: "section[data-working-id]" }],
  renderHTML: ({ HTMLAttributes }) => ["section", HTMLAttributes],
});

/** Every node and mark but the three that the editor shows with views of its own. */
export const textNodes: Extensions = [
  StarterKit.configure({
    blockquote: false,
    heading: false,
    link: false,
    listItem: false,
    orderedList: false,
    underline: false,
  }),
  SectionHeading,
  Blockquote.extend({ content: plainBlocks }),
  ListItem.extend({ content: "paragraph (paragraph | bulletList | orderedList | codeBlock | photo)*" }),
  NumberedList,
  PlainLink,
  Table.configure({ resizable: false }),
  TableRow,
  TextTableHeader,
  TextTableCell,
  CautionNode,
];

/** The whole vocabulary of a document, headless: the editor adds node views, the server none. */
export const documentNodes: Extensions = [...textNodes, PhotoNode, PhotoGroupNode, WorkingNode];

function dataAttribute(name: string, fallback: string | null) {
  const key = name.slice("data-".length).replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase());
  return {
    default: fallback,
    parseHTML: (element: HTMLElement) => element.getAttribute(name) ?? fallback,
    renderHTML: (attributes: Record<string, unknown>) =>
      attributes[key] == null ? {} : { [name]: attributes[key] },
  };
}

/** Numbers carried on the clipboard; what does not read becomes an empty set, which the form then asks for. */
function parseInputs(text: string | null): Record<string, unknown> {
  try {
    const inputs: unknown = JSON.parse(text ?? "{}");
    return typeof inputs === "object" && inputs !== null && !Array.isArray(inputs) ? { ...inputs } : {};
  } catch {
    return {};
  }
}
