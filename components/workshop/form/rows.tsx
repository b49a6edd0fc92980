import { ArrowDown, ArrowUp, Plus, X } from "lucide-react";
import type { ReactNode } from "react";
import { hintOf, labelOf } from "./field-words";

type Props = {
  name: string;
  path: string;
  rows: readonly { key: string; node: ReactNode; called: string }[];
  onRemove: (index: number) => void;
  /** Absent: the order says nothing. */
  onMove?: (index: number, by: -1 | 1) => void;
  /** The button, or the list, that adds a row. */
  add: ReactNode;
  empty?: string;
};

/** A list in the side sheet: each row with what takes it out, and moves it where the order matters. */
export function Rows({ name, path, rows, onRemove, onMove, add, empty }: Props) {
  const hint = hintOf(name);
  return (
    <fieldset id={path} className="grid gap-2">
      <legend className="font-semibold">{labelOf(name)}</legend>
      {hint && <p className="text-sm text-ink-2">{hint}</p>}
      {rows.length === 0 && empty && <p className="text-sm text-ink-2">{empty}</p>}
      <ul className="grid gap-2">
        {rows.map(({ key, node, called }, index) => (
          <li key={key} className="flex items-start gap-1">
            <div className="min-w-0 flex-1">{node}</div>
            {onMove && (
              <>
                <RowButton says={`Move ${called} up`} disabled={index === 0} onClick={() => onMove(index, -1)}>
                  <ArrowUp aria-hidden size={18} />
                </RowButton>
                <RowButton says={`Move ${called} down`} disabled={index === rows.length - 1} onClick={() => onMove(index, 1)}>
                  <ArrowDown aria-hidden size={18} />
                </RowButton>
              </>
            )}
            <RowButton says={`Take out ${called}`} onClick={() => onRemove(index)}>
              <X aria-hidden size={18} />
            </RowButton>
          </li>
        ))}
      </ul>
      {add}
    </fieldset>
  );
}

type ButtonProps = { says: string; disabled?: boolean; onClick: () => void; children: ReactNode };

function RowButton({ says, disabled = false, onClick, children }: ButtonProps) {
  return (
    <button
      type="button"
      aria-label={says}
      title={says}
      disabled={disabled}
      onClick={onClick}
      className="inline-flex min-h-12 min-w-9 items-center justify-center rounded-lg border border-rule bg-sheet disabled:opacity-40"
    >
      {children}
    </button>
  );
}

export function AddRow({ says, onClick }: { says: string; onClick: () => void }) {
  return (
    <button type="button" onClick={onClick} className="link inline-flex min-h-12 items-center gap-1 justify-self-start">
      <Plus aria-hidden size={18} />
      {says}
    </button>
  );
}
