"use client";

import { useRef, useState, type KeyboardEvent } from "react";
import { clsx } from "clsx";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { setLink } from "@/lib/core/tree/edits/set-link";
import type { Cause } from "@/lib/core/tree/schema";
import type { Place } from "../place";
import { CellEditor } from "./cell-editor";
import { rowSaysNothing, type Column } from "./columns";
import { readCell } from "./read-cell";

type Props = { bench: Workbench; causes: readonly Cause[]; columns: readonly Column[]; onOpen: (node: Place["node"]) => void };
type At = { row: number; column: number };

const MOVES: Readonly<Record<string, At>> = {
  ArrowUp: { row: -1, column: 0 },
  ArrowDown: { row: 1, column: 0 },
  ArrowLeft: { row: 0, column: -1 },
  ArrowRight: { row: 0, column: 1 },
};

/** The cells, walked and typed into as in a spreadsheet. One cell at a time takes the Tab key. */
export function StrengthGrid({ bench, causes, columns, onOpen }: Props) {
  const [at, setAt] = useState<At>({ row: 0, column: 0 });
  const [editing, setEditing] = useState<string | null>(null);
  const grid = useRef<HTMLTableElement>(null);
  const move = ({ row, column }: At) => {
    const next = { row: clamp(row, causes.length), column: clamp(column, columns.length) };
    setAt(next);
    grid.current?.querySelector<HTMLElement>(`[data-cell="${next.row},${next.column}"]`)?.focus();
  };
  const put = (cell: At, text: string): boolean => {
    const [cause, column] = [causes[cell.row], columns[cell.column]];
    const link = readCell(text);
    if (!cause || !column || link === undefined) return false;
    bench.edit(
      setLink(bench.session.get().tree, cause.key, { gives: column.check.key, finding: column.finding }, link),
      `${cause.title}: ${column.title}`,
    );
    return true;
  };
  const pressed = (event: KeyboardEvent, cell: At) => {
    if (editing !== null) return;
    const by = MOVES[event.key];
    if (by) move({ row: cell.row + by.row, column: cell.column + by.column });
    else if (event.key === "Home") move({ ...cell, column: 0 });
    else if (event.key === "End") move({ ...cell, column: columns.length - 1 });
    else if (event.key === "Enter" || event.key === "F2") setEditing(shown(causes[cell.row], columns[cell.column]));
    else if (event.key === "Delete" || event.key === "Backspace") put(cell, "");
    else if (event.key.length === 1 && !event.ctrlKey && !event.metaKey && !event.altKey) setEditing(event.key);
    else return;
    event.preventDefault();
  };
  return (
    <div className="min-h-0 flex-1 overflow-auto rounded-xl border border-rule bg-sheet">
      <table
        ref={grid}
        role="grid"
        aria-label="How often each cause gives each finding"
        className="border-separate border-spacing-0 text-sm"
      >
        <ColumnHeads columns={columns} onOpen={onOpen} />
        <tbody>
          {causes.map((cause, row) => (
            <tr key={cause.key}>
              <th
                scope="row"
                className="sticky left-0 z-10 max-w-56 min-w-44 border-r border-b border-rule bg-sheet px-2 py-1 text-left font-normal"
              >
                <button type="button" className="link text-left" onClick={() => onOpen({ list: "causes", key: cause.key })}>
                  {cause.title}
                </button>
                {columns.length > 0 && rowSaysNothing(columns, row) && (
                  <span title="Nothing on this sheet tells it from the others"> =</span>
                )}
              </th>
              {columns.map((column, index) => {
                const here = at.row === row && at.column === index;
                return (
                  <td
                    key={`${column.check.key}/${column.finding}`}
                    role="gridcell"
                    data-cell={`${row},${index}`}
                    tabIndex={here ? 0 : -1}
                    onFocus={() => setAt({ row, column: index })}
                    onDoubleClick={() => setEditing(shown(cause, column))}
                    onKeyDown={(event) => pressed(event, { row, column: index })}
                    className={clsx(
                      "h-11 min-w-24 border-r border-b border-rule px-2 text-center focus:bg-shoal",
                      tone(cause, column, row),
                    )}
                  >
                    {here && editing !== null ? (
                      <CellEditor
                        label={`${cause.title}: ${column.check.title}, ${column.title}`}
                        begin={editing}
                        onEnd={(text, then) => {
                          if (text !== null && !put({ row, column: index }, text)) return false;
                          setEditing(null);
                          move({ row: row + then.row, column: index + then.column });
                          return true;
                        }}
                      />
                    ) : (
                      shown(cause, column)
                    )}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function ColumnHeads({ columns, onOpen }: Pick<Props, "columns" | "onOpen">) {
  const checks = [...new Set(columns.map(({ check }) => check))];
  return (
    <thead className="sticky top-0 z-20 bg-sheet">
      <tr>
        <td rowSpan={2} className="sticky left-0 z-30 border-r border-b border-rule bg-sheet" />
        {checks.map((check) => (
          <th
            key={check.key}
            scope="colgroup"
            colSpan={check.findings.length}
            className="border-r border-b border-rule bg-sheet px-2 py-1 text-left"
          >
            <button type="button" className="link text-left" onClick={() => onOpen({ list: "checks", key: check.key })}>
              {check.title}
            </button>
          </th>
        ))}
      </tr>
      <tr>
        {columns.map((column) => (
          <th
            key={`${column.check.key}/${column.finding}`}
            scope="col"
            className="max-w-32 border-r border-b border-rule bg-sheet px-2 py-1 align-bottom font-normal"
          >
            {column.title}
            {column.separatesNothing && <span title="All these causes give it about as often"> =</span>}
          </th>
        ))}
      </tr>
    </thead>
  );
}

const clamp = (index: number, count: number): number => Math.max(0, Math.min(count - 1, index));

function shown(cause: Cause | undefined, column: Column | undefined): string {
  const link = column && cause?.gives[column.check.key]?.[column.finding];
  return link === undefined ? "" : String(link);
}

/** What speaks for a cause is tinted one way, what speaks against it the other; the words carry it. */
function tone(cause: Cause, column: Column, row: number): string {
  if (cause.gives[column.check.key]?.[column.finding] === undefined) return "";
  const ratio = (column.shares[row] ?? 0) / column.sound;
  return ratio > 1 ? "bg-sound-wash" : ratio < 1 ? "bg-buoy-wash" : "";
}
