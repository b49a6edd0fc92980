import { clsx } from "clsx";
import type { ReactNode } from "react";

export type Column<Row> = {
  key: string;
  title: ReactNode;
  cell: (row: Row) => ReactNode;
  /** Figures off an instrument, set right. */ figure?: boolean;
};

type Props<Row> = {
  caption: string;
  hideCaption?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  empty: ReactNode;
};

/** A table that people read; it scrolls sideways within itself, never the page, and says so when it is empty. */
export function Table<Row>({ caption, hideCaption = false, columns, rows, rowKey, empty }: Props<Row>) {
  if (rows.length === 0) return <>{empty}</>;
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full border-collapse text-sm">
        <caption className={clsx("pb-2 text-left font-semibold", hideCaption && "visually-hidden")}>{caption}</caption>
        <thead>
          <tr className="border-b border-rule text-left text-ink-2">
            {columns.map((column) => (
              <th key={column.key} scope="col" className={clsx("py-1.5 pr-4 font-medium whitespace-nowrap", column.figure && "text-right")}>
                {column.title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-b border-rule/60">
              {columns.map((column) => (
                <td key={column.key} className={clsx("py-2.5 pr-4 align-top", column.figure && "dial text-right whitespace-nowrap")}>
                  {column.cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
