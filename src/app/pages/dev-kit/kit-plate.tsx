import { Button } from "#src/components/button.tsx";
import { Caution } from "#src/components/caution.tsx";
import { DataTable } from "#src/components/data-table.tsx";
import { NumberTag } from "#src/components/number-tag.tsx";
import { Plate } from "#src/components/plate.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { KitDrawing } from "./kit-drawing.tsx";

const results = [
  { name: "Heel, from the square end", unit: "mm", value: "118.0" },
  { name: "Toe, from the square end", unit: "mm", value: "141.6" },
  { name: "Wrap width", unit: "mm", value: "119.7" },
];

export function KitPlate() {
  return (
    <div className="flex flex-col gap-6">
      <Plate
        title="Cope of a round branch on a round header"
        number={<NumberTag to="#w12">W12</NumberTag>}
        aside="Maren Holt, 3 March 2026"
        drawing={<KitDrawing />}
        actions={
          <>
            <Button tone="primary">Print the template</Button>
            <Button>Change the numbers</Button>
            <Button tone="quiet">Start a counter-working</Button>
          </>
        }
      >
        <div className="grid grid-cols-2 gap-4">
          <TextField label="Branch, outside" unit="mm" defaultValue="38.1" inputMode="decimal" />
          <TextField label="Header, outside" unit="mm" defaultValue="40.0" inputMode="decimal" />
          <TextField label="Angle" unit="°" defaultValue="5" error="Give 15° to 90°." inputMode="decimal" />
        </div>
        <DataTable
          caption="Results"
          columns={[
            { key: "name", head: "Length", rowHead: true, cell: (row) => row.name },
            { key: "value", head: "Result", unit: "mm", numeric: true, cell: (row) => row.value },
          ]}
          rows={results}
          rowKey={(row) => row.name}
        />
      </Plate>
      <Caution>
        <p>
          This is a sum, not an approval. Check it, follow local rules, and have a coded welder or a licensed
          engineer judge what people will ride in or stand under.
        </p>
      </Caution>
    </div>
  );
}
