import { clsx } from "clsx";
import type { ReactNode } from "react";

export type DataColumn<Row> = {
  key: string;
  head: ReactNode;
  /** Shown in the head, so that the figures stand alone. */
  unit?: string;
  /** Figures: mono, to the right. */
  numeric?: boolean;
  /** The cell that names the row. */
  rowHead?: boolean;
  cell: (row: Row) => ReactNode;
};

type DataTableProps<Row> = {
  caption: ReactNode;
  captionHidden?: boolean;
  columns: DataColumn<Row>[];
  rows: Row[];
  rowKey: (row: Row) => string;
};

/** Figures to the right, units in the head; scrolls in itself on a phone. */
export function DataTable<Row>({ caption, captionHidden, columns, rows, rowKey }: DataTableProps<Row>) {
  return (
    <div className="overflow-x-auto font-sans">
      <table className="w-full border-collapse text-sm">
        <caption className={captionHidden ? "sr-only" : "pb-2 text-left font-semibold"}>{caption}</caption>
        <thead>
          <tr className="border-b-2 border-edge">
            {columns.map((column) => (
              <th
                key={column.key}
                scope="col"
                className={clsx(
                  "px-3 py-2 align-bottom text-xs font-semibold text-ink-soft first:pl-0 last:pr-0",
                  column.numeric ? "text-right" : "text-left",
                )}
              >
                {column.head}
                {column.unit ? <span className="figures block font-normal">{column.unit}</span> : null}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-b border-hairline">
              {columns.map((column) => (
                <DataCell key={column.key} column={column} row={row} />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function DataCell<Row>({ column, row }: { column: DataColumn<Row>; row: Row }) {
  const className = clsx(
    "px-3 py-2.5 align-baseline first:pl-0 last:pr-0",
    column.numeric ? "figures text-right whitespace-nowrap" : "text-left",
  );
  if (!column.rowHead) return <td className={className}>{column.cell(row)}</td>;
  return (
    <th scope="row" className={clsx(className, "font-semibold")}>
      {column.cell(row)}
    </th>
  );
}
