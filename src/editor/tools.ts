import type { Editor } from "@tiptap/core";
import Bold from "lucide-react/icons/bold";
import Camera from "lucide-react/icons/camera";
import Code from "lucide-react/icons/code";
import DraftingCompass from "lucide-react/icons/drafting-compass";
import Heading2 from "lucide-react/icons/heading-2";
import Heading3 from "lucide-react/icons/heading-3";
import Image from "lucide-react/icons/image";
import Images from "lucide-react/icons/images";
import Italic from "lucide-react/icons/italic";
import Link from "lucide-react/icons/link";
import List from "lucide-react/icons/list";
import ListOrdered from "lucide-react/icons/list-ordered";
import Minus from "lucide-react/icons/minus";
import Redo from "lucide-react/icons/redo-2";
import SquareCode from "lucide-react/icons/square-code";
import Strikethrough from "lucide-react/icons/strikethrough";
import Table from "lucide-react/icons/table";
import TextQuote from "lucide-react/icons/text-quote";
import TriangleAlert from "lucide-react/icons/triangle-alert";
import Undo from "lucide-react/icons/undo-2";
import type { ComponentType } from "react";

/** What the page does for the tools that put in a feature's block. */
export interface Inserts {
  photos(kind: "photos" | "group" | "camera"): void;
  working(): void;
}

export interface ToolContext {
  editor: Editor;
  inserts: Inserts;
  editLink(): void;
}

export interface Tool {
  id: string;
  /** What it does, in full. */
  name: string;
  /** One short word, where the tool has room for it. */
  word: string;
  icon: ComponentType<{ className?: string; "aria-hidden"?: boolean | "true" }>;
  /** Keys as ProseMirror names them; `Mod` is Ctrl, or Cmd on a Mac. */
  keys?: string;
  /** True while the text at the caret has it; left out for tools that put something in. */
  active?(editor: Editor): boolean;
  enabled?(editor: Editor): boolean;
  run(context: ToolContext): void;
}

type Chain = ReturnType<Editor["chain"]>;

const act = (change: (chain: Chain) => Chain) => (context: ToolContext) => {
  change(context.editor.chain().focus()).run();
};
const can = (change: (chain: Chain) => Chain) => (editor: Editor) => change(editor.can().chain()).run();

function tool(
  id: string,
  name: string,
  word: string,
  icon: Tool["icon"],
  change: (chain: Chain) => Chain,
  more: Partial<Tool> = {},
): Tool {
  return { id, name, word, icon, enabled: can(change), run: act(change), ...more };
}

const is = (name: string, attributes?: object) => (editor: Editor) => editor.isActive(name, attributes);

/** What changes the text itself, as it lies on the rail. */
export const textTools: readonly Tool[] = [
  tool("heading2", "Heading", "Heading", Heading2, (c) => c.toggleHeading({ level: 2 }), {
    keys: "Mod-Alt-2",
    active: is("heading", { level: 2 }),
  }),
  tool("heading3", "Smaller heading", "Smaller", Heading3, (c) => c.toggleHeading({ level: 3 }), {
    keys: "Mod-Alt-3",
    active: is("heading", { level: 3 }),
  }),
  linkTool(),
  tool("bold", "Bold", "Bold", Bold, (c) => c.toggleBold(), { keys: "Mod-b", active: is("bold") }),
  tool("italic", "Italic", "Italic", Italic, (c) => c.toggleItalic(), {
    keys: "Mod-i",
    active: is("italic"),
  }),
  tool("strike", "Struck out", "Strike", Strikethrough, (c) => c.toggleStrike(), {
    keys: "Mod-Shift-s",
    active: is("strike"),
  }),
  tool("bulletList", "List", "List", List, (c) => c.toggleBulletList(), {
    keys: "Mod-Shift-8",
    active: is("bulletList"),
  }),
  tool("orderedList", "Numbered list", "Steps", ListOrdered, (c) => c.toggleOrderedList(), {
    keys: "Mod-Shift-7",
    active: is("orderedList"),
  }),
  tool("blockquote", "Quote", "Quote", TextQuote, (c) => c.toggleBlockquote(), {
    keys: "Mod-Shift-b",
    active: is("blockquote"),
  }),
  tool("code", "Code in the line", "Code", Code, (c) => c.toggleCode(), {
    keys: "Mod-e",
    active: is("code"),
  }),
  tool("codeBlock", "Block of code", "Code block", SquareCode, (c) => c.toggleCodeBlock(), {
    keys: "Mod-Alt-c",
    active: is("codeBlock"),
  }),
  tool("horizontalRule", "Dividing line", "Line", Minus, (c) => c.setHorizontalRule()),
];

/** What is put in as a block of its own. */
export const insertTools: readonly Tool[] = [
  {
    id: "working",
    name: "Put in a working",
    word: "Working",
    icon: DraftingCompass,
    keys: "Alt-Shift-w",
    run: ({ inserts }) => inserts.working(),
  },
  {
    id: "photo",
    name: "Put in photos",
    word: "Photo",
    icon: Image,
    keys: "Alt-Shift-p",
    run: ({ inserts }) => inserts.photos("photos"),
  },
  {
    id: "photoGroup",
    name: "Put in photos side by side, two to six",
    word: "Side by side",
    icon: Images,
    keys: "Alt-Shift-g",
    run: ({ inserts }) => inserts.photos("group"),
  },
  tool("caution", "Caution", "Caution", TriangleAlert, (c) => c.toggleWrap("caution"), {
    keys: "Alt-Shift-c",
    active: is("caution"),
  }),
  tool(
    "table",
    "Put in a table",
    "Table",
    Table,
    (c) => c.insertTable({ rows: 3, cols: 3, withHeaderRow: true }),
    { keys: "Alt-Shift-t", enabled: (editor) => !editor.isActive("table") },
  ),
];

/** For devices with a camera in the hand. */
export const cameraTool: Tool = {
  id: "camera",
  name: "Take a photo",
  word: "Camera",
  icon: Camera,
  run: ({ inserts }) => inserts.photos("camera"),
};

export const historyTools: readonly Tool[] = [
  tool("undo", "Undo", "Undo", Undo, (c) => c.undo(), { keys: "Mod-z" }),
  tool("redo", "Do again", "Redo", Redo, (c) => c.redo(), { keys: "Mod-Shift-z" }),
];

/** Shown while the caret is in a table. */
export const tableActions: readonly { label: string; run(chain: Chain): Chain }[] = [
  { label: "Row above", run: (c) => c.addRowBefore() },
  { label: "Row below", run: (c) => c.addRowAfter() },
  { label: "Column before", run: (c) => c.addColumnBefore() },
  { label: "Column after", run: (c) => c.addColumnAfter() },
  { label: "Head row on or off", run: (c) => c.toggleHeaderRow() },
  { label: "Remove row", run: (c) => c.deleteRow() },
  { label: "Remove column", run: (c) => c.deleteColumn() },
  { label: "Remove table", run: (c) => c.deleteTable() },
];

export const allTools: readonly Tool[] = [...insertTools, ...textTools, ...historyTools];

function linkTool(): Tool {
  return {
    id: "link",
    name: "Link",
    word: "Link",
    icon: Link,
    keys: "Mod-k",
    active: is("link"),
    enabled: (editor) => !editor.isActive("codeBlock"),
    run: ({ editLink }) => editLink(),
  };
}
