import { lazy, Suspense } from "react";
import type { SortableListProps } from "./sortable-list.tsx";

const SortableList = lazy(() =>
  import("./sortable-list.tsx").then((module) => ({ default: module.SortableList })),
);

/** The sortable list in its own chunk; until it is there, the items stand in their order. */
export function LazySortableList(props: SortableListProps) {
  return (
    <Suspense fallback={<PlainList {...props} />}>
      <SortableList {...props} />
    </Suspense>
  );
}

function PlainList({ label, items }: SortableListProps) {
  return (
    <ol aria-label={label} className="border-t border-hairline">
      {items.map((item) => (
        <li key={item.id} className="flex min-h-14 items-center border-b border-hairline px-13 py-2">
          {item.content}
        </li>
      ))}
    </ol>
  );
}
