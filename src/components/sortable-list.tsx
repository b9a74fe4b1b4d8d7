import {
  type Announcements,
  closestCenter,
  DndContext,
  type DragEndEvent,
  KeyboardSensor,
  PointerSensor,
  useSensor,
  useSensors,
} from "@dnd-kit/core";
import {
  arrayMove,
  SortableContext,
  sortableKeyboardCoordinates,
  useSortable,
  verticalListSortingStrategy,
} from "@dnd-kit/sortable";
import { CSS } from "@dnd-kit/utilities";
import { clsx } from "clsx";
import ArrowDown from "lucide-react/icons/arrow-down";
import ArrowUp from "lucide-react/icons/arrow-up";
import GripVertical from "lucide-react/icons/grip-vertical";
import { type ReactNode, useId } from "react";

export type SortableItem = { id: string; label: string; content: ReactNode };

export type SortableListProps = {
  label: string;
  items: SortableItem[];
  /** Gets the ids in their new order. */
  onReorder: (ids: string[]) => void;
};

/** Order by dragging, by the keyboard (space, arrows, space) or by the two buttons. Load it through `LazySortableList`. */
export function SortableList({ label, items, onReorder }: SortableListProps) {
  const contextId = useId();
  const sensors = useSensors(
    useSensor(PointerSensor, { activationConstraint: { distance: 6 } }),
    useSensor(KeyboardSensor, { coordinateGetter: sortableKeyboardCoordinates }),
  );
  const ids = items.map((item) => item.id);
  const move = (from: number, to: number) => {
    if (from !== to && from >= 0 && to >= 0 && to < ids.length) onReorder(arrayMove(ids, from, to));
  };
  const handleDragEnd = ({ active, over }: DragEndEvent) => {
    if (over) move(ids.indexOf(String(active.id)), ids.indexOf(String(over.id)));
  };
  return (
    <DndContext
      id={contextId}
      sensors={sensors}
      collisionDetection={closestCenter}
      accessibility={{ announcements: announcementsFor(items), screenReaderInstructions: instructions }}
      onDragEnd={handleDragEnd}
    >
      <SortableContext items={ids} strategy={verticalListSortingStrategy}>
        <ol aria-label={label} className="border-t border-hairline">
          {items.map((item, index) => (
            <SortableRow
              key={item.id}
              item={item}
              place={index}
              last={index === items.length - 1}
              onMove={move}
            />
          ))}
        </ol>
      </SortableContext>
    </DndContext>
  );
}

const instructions = {
  draggable:
    "Press space to pick up, the up and down arrows to move, space to put down, escape to leave it where it was.",
};

/** What a screen reader hears while an item moves: its name and place, not its id. */
function announcementsFor(items: SortableItem[]): Announcements {
  const place = (id: string | number) => items.findIndex((item) => item.id === id) + 1;
  const name = (id: string | number) => items[place(id) - 1]?.label ?? "It";
  const at = (id: string | number) => `place ${place(id)} of ${items.length}`;
  return {
    onDragStart: ({ active }) => `${name(active.id)} is picked up at ${at(active.id)}.`,
    onDragOver: ({ active, over }) => (over ? `${name(active.id)} is over ${at(over.id)}.` : undefined),
    onDragEnd: ({ active, over }) =>
      over ? `${name(active.id)} is put down at ${at(over.id)}.` : `${name(active.id)} is where it was.`,
    onDragCancel: ({ active }) => `${name(active.id)} is where it was.`,
  };
}

type SortableRowProps = {
  item: SortableItem;
  place: number;
  last: boolean;
  onMove: (from: number, to: number) => void;
};

const handleClass =
  "grid size-11 shrink-0 cursor-pointer place-content-center rounded text-ink-soft hover:bg-grey-wash disabled:cursor-not-allowed disabled:opacity-30";

function SortableRow({ item, place, last, onMove }: SortableRowProps) {
  const { attributes, listeners, setNodeRef, transform, transition, isDragging } = useSortable({
    id: item.id,
  });
  return (
    <li
      ref={setNodeRef}
      style={{ transform: CSS.Translate.toString(transform), transition }}
      className={clsx(
        "flex min-h-14 items-center border-b border-hairline bg-paper",
        isDragging && "relative z-10 bg-paper-raised shadow-lifted",
      )}
    >
      <button
        {...attributes}
        {...listeners}
        type="button"
        aria-label={`Move ${item.label}`}
        className={clsx(handleClass, "cursor-grab touch-none")}
      >
        <GripVertical aria-hidden="true" className="size-5" />
      </button>
      <div className="min-w-0 flex-1 px-2 py-2">{item.content}</div>
      <button
        type="button"
        aria-label={`Move ${item.label} up`}
        disabled={place === 0}
        onClick={() => onMove(place, place - 1)}
        className={handleClass}
      >
        <ArrowUp aria-hidden="true" className="size-5" />
      </button>
      <button
        type="button"
        aria-label={`Move ${item.label} down`}
        disabled={last}
        onClick={() => onMove(place, place + 1)}
        className={handleClass}
      >
        <ArrowDown aria-hidden="true" className="size-5" />
      </button>
    </li>
  );
}
