import { useState } from "react";
import { Button } from "#src/components/button.tsx";
import { Dialog } from "#src/components/dialog.tsx";
import { LazySortableList } from "#src/components/lazy-sortable-list.tsx";
import { Menu } from "#src/components/menu.tsx";
import { Tabs } from "#src/components/tabs.tsx";
import { toasts } from "#src/components/toast-store.ts";

const stages = ["Frame", "Front suspension", "Steering", "Rear end"];

export function KitOverlays() {
  const [order, setOrder] = useState(stages);
  return (
    <div className="flex flex-col gap-8">
      <div className="flex flex-wrap gap-3">
        <Dialog
          title="Overturn choice C7?"
          description="Everything that stood on it is listed as a knock-on."
          trigger={<Button>Open a dialog</Button>}
          actions={
            <>
              <Button>Leave it standing</Button>
              <Button tone="destructive">Overturn it</Button>
            </>
          }
        >
          <p>Three workings, two pieces and one published entry stood on this choice.</p>
        </Dialog>
        <Menu
          trigger={<Button>Open a menu</Button>}
          label="Entry"
          entries={[
            { kind: "link", label: "Read it", to: "#read" },
            { kind: "action", label: "Copy the address", onSelect: () => undefined },
            { kind: "separator" },
            { kind: "action", label: "Withdraw it", onSelect: () => undefined, destructive: true },
          ]}
        />
        <Button
          onClick={() =>
            toasts.show({
              message: "Piece H14 scrapped.",
              kind: "success",
              undo: { label: "Undo", run: () => undefined },
            })
          }
        >
          Show a message
        </Button>
      </div>
      <Tabs
        label="A choice"
        tabs={[
          { value: "reason", label: "Reason", content: "The tray set the height." },
          { value: "stands", label: "Stands on", content: "W9, front ride height." },
          { value: "history", label: "History", content: "Overturned on 30 May 2026." },
        ]}
      />
      <LazySortableList
        label="Stages"
        items={order.map((stage) => ({ id: stage, label: stage, content: stage }))}
        onReorder={setOrder}
      />
    </div>
  );
}
