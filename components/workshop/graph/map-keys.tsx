import { Fold } from "@/components/ui/fold";

const KEYS = [
  ["Tab", "to the next node or link"],
  ["Enter", "opens it"],
  ["Arrows", "move a chosen node"],
  ["Shift and click", "chooses several"],
  ["Delete", "takes out what is chosen"],
  ["Ctrl C, V, D", "copy, paste, duplicate"],
  ["Ctrl Z, Shift Ctrl Z", "undo, redo"],
] as const;

/** What the keyboard does in the picture. */
export function MapKeys() {
  return (
    <div className="absolute top-2 right-2 z-10 max-w-72 rounded-lg bg-sheet px-3 text-sm">
      <Fold title="Keys">
        <dl className="grid grid-cols-[auto_1fr] gap-x-3 pb-2">
          {KEYS.map(([key, does]) => (
            <div key={key} className="contents">
              <dt className="font-semibold">{key}</dt>
              <dd>{does}</dd>
            </div>
          ))}
        </dl>
      </Fold>
    </div>
  );
}
