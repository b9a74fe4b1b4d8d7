import { type ReactNode, use } from "react";
import { isAllowedHref, leavesSite } from "#shared/document/href.ts";
import type {
  DocumentMark,
  DocumentNode,
  PhotoAttributes,
  WorkingAttributes,
} from "#shared/document/types.ts";
import { Caution } from "#src/components/caution.tsx";
import { SlotsContext } from "./document-slots.ts";
import { keepUnits } from "./keep-units.ts";

interface NodeProps {
  node: DocumentNode;
  children?: ReactNode;
}

interface MarkProps {
  mark: DocumentMark;
  children?: ReactNode;
}

const span = (value: unknown) => (typeof value === "number" && value > 1 ? value : undefined);

function Heading({ node, children }: NodeProps) {
  return node.attrs?.level === 3 ? <h3>{children}</h3> : <h2>{children}</h2>;
}

function NumberedList({ node, children }: NodeProps) {
  const start = node.attrs?.start;
  return <ol start={typeof start === "number" && start !== 1 ? start : undefined}>{children}</ol>;
}

function CodeBlock({ children }: NodeProps) {
  return (
    // A long line scrolls sideways: the keyboard must reach it too.
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolling region needs focus to be scrolled by keyboard
    <pre tabIndex={0}>
      <code>{children}</code>
    </pre>
  );
}

function TableBlock({ children }: NodeProps) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolling region needs focus to be scrolled by keyboard
    <section className="table-scroll" aria-label="Table" tabIndex={0}>
      <table>
        <tbody>{children}</tbody>
      </table>
    </section>
  );
}

function HeaderCell({ node, children }: NodeProps) {
  return (
    <th colSpan={span(node.attrs?.colspan)} rowSpan={span(node.attrs?.rowspan)}>
      {children}
    </th>
  );
}

function Cell({ node, children }: NodeProps) {
  return (
    <td colSpan={span(node.attrs?.colspan)} rowSpan={span(node.attrs?.rowspan)}>
      {children}
    </td>
  );
}

function PhotoBlock({ node }: NodeProps) {
  const slots = useSlots();
  return <slots.photo {...photoAttributes(node)} />;
}

function PhotoGroupBlock({ node }: NodeProps) {
  const slots = useSlots();
  return <slots.photoGroup photos={(node.content ?? []).map(photoAttributes)} />;
}

function WorkingBlock({ node }: NodeProps) {
  const slots = useSlots();
  return <slots.working {...(node.attrs as unknown as WorkingAttributes)} />;
}

function Link({ mark, children }: MarkProps) {
  const href = mark.attrs?.href;
  if (!isAllowedHref(href)) return children;
  return (
    <a href={href} rel={leavesSite(href) ? "noopener nofollow ugc" : undefined}>
      {children}
    </a>
  );
}

/** One component for each node; defined once, since a new function would make React start the block afresh. */
export const nodeMapping = {
  doc: ({ children }: NodeProps) => children,
  text: ({ node }: NodeProps) => keepUnits(node.text ?? ""),
  paragraph: ({ children }: NodeProps) => <p>{children}</p>,
  heading: Heading,
  bulletList: ({ children }: NodeProps) => <ul>{children}</ul>,
  orderedList: NumberedList,
  listItem: ({ children }: NodeProps) => <li>{children}</li>,
  blockquote: ({ children }: NodeProps) => <blockquote>{children}</blockquote>,
  codeBlock: CodeBlock,
  horizontalRule: () => <hr />,
  hardBreak: () => <br />,
  table: TableBlock,
  tableRow: ({ children }: NodeProps) => <tr>{children}</tr>,
  tableHeader: HeaderCell,
  tableCell: Cell,
  caution: ({ children }: NodeProps) => <Caution>{children}</Caution>,
  photo: PhotoBlock,
  photoGroup: PhotoGroupBlock,
  working: WorkingBlock,
};

export const markMapping = {
  bold: ({ children }: MarkProps) => <strong>{children}</strong>,
  italic: ({ children }: MarkProps) => <em>{children}</em>,
  strike: ({ children }: MarkProps) => <s>{children}</s>,
  code: ({ children }: MarkProps) => <code>{children}</code>,
  link: Link,
};

/** A block from a later version of the site: its words are shown, its form is not known. */
export function UnknownNode({ children }: NodeProps) {
  return children;
}

export function UnknownMark({ children }: MarkProps) {
  return children;
}

function useSlots() {
  const slots = use(SlotsContext);
  if (!slots) throw new Error("Show document blocks inside DocumentView.");
  return slots;
}

function photoAttributes({ attrs = {} }: DocumentNode): PhotoAttributes {
  return {
    photoId: String(attrs.photoId),
    alt: typeof attrs.alt === "string" ? attrs.alt : null,
    caption: typeof attrs.caption === "string" ? attrs.caption : "",
  };
}
