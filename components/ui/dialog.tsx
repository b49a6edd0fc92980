"use client";

import { X } from "lucide-react";
import { useEffect, useId, useRef, type ReactNode } from "react";

type Props = {
  open: boolean;
  onClose: () => void;
  title: ReactNode;
  children: ReactNode;
  /** Rises from the lower edge, within a thumb's reach. */ sheet?: boolean;
};

/** The browser's own dialog: it holds the focus, closes on Escape and needs no style that a strict content policy forbids. */
export function Dialog({ open, onClose, title, children, sheet = false }: Props) {
  const box = useRef<HTMLDialogElement>(null);
  const heading = useId();
  useEffect(() => {
    const dialog = box.current;
    if (!dialog) return;
    if (open && !dialog.open) dialog.showModal();
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={box}
      aria-labelledby={heading}
      onClose={onClose}
      onClick={(event) => {
        if (event.target === box.current) onClose();
      }}
      className={
        "w-full max-w-lg overscroll-contain border-[1.5px] border-edge bg-paper p-0 text-ink backdrop:bg-[rgb(0_0_0/0.55)] " +
        (sheet ? "mx-auto mt-auto mb-0 max-h-[92dvh] rounded-t-2xl" : "m-auto max-h-[92dvh] rounded-xl")
      }
    >
      {open && (
        <div className="p-4">
          <div className="mb-3 flex items-start justify-between gap-3">
            <h2 id={heading} className="pt-2">
              {title}
            </h2>
            <button
              type="button"
              onClick={onClose}
              className="inline-flex min-h-12 min-w-12 flex-none items-center justify-center rounded-lg border-[1.5px] border-edge bg-sheet"
            >
              <X aria-hidden size={22} />
              <span className="visually-hidden">Close</span>
            </button>
          </div>
          {children}
        </div>
      )}
    </dialog>
  );
}
