import { DataTable } from "#src/components/data-table.tsx";
import type { Difference } from "../differences.ts";

interface DifferenceTableProps {
  caption: string;
  /** What the two columns of numbers are called. */
  first: string;
  second: string;
  rows: Difference[];
}

/** Two sums against each other: only what differs, with the change. */
export function DifferenceTable({ caption, first, second, rows }: DifferenceTableProps) {
  return (
    <DataTable
      caption={caption}
      rowKey={({ name }) => name}
      rows={rows}
      columns={[
        {
          key: "label",
          head: "What",
          rowHead: true,
          cell: ({ label, unit }) => (unit ? `${label}, ${unit}` : label),
        },
        { key: "first", head: first, numeric: true, cell: (row) => row.first },
        { key: "second", head: second, numeric: true, cell: (row) => row.second },
        { key: "change", head: "Change", numeric: true, cell: (row) => row.change },
      ]}
    />
  );
}
