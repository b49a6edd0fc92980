"use client";

import { useEffect } from "react";
import type { Workbench } from "@/lib/client/workshop/workbench";

/** Ctrl or Cmd with Z, and with Shift or Y; in a text field the browser's own undo of what is typed comes first. */
export function useUndoKeys(bench: Workbench): void {
  useEffect(() => {
    const pressed = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || isTyping(event.target)) return;
      const key = event.key.toLowerCase();
      const redo = key === "y" || (key === "z" && event.shiftKey);
      if (!redo && key !== "z") return;
      event.preventDefault();
      if (redo) bench.redo();
      else bench.undo();
    };
    window.addEventListener("keydown", pressed);
    return () => window.removeEventListener("keydown", pressed);
  }, [bench]);
}

export const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement && (target.isContentEditable || ["INPUT", "TEXTAREA", "SELECT"].includes(target.tagName));
