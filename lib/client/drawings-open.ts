const KEY = "gudgeon.drawings";
const CHANGED = "drawingschange";

/** What was wished on this page, for browsers that keep nothing. */
let wished: boolean | null = null;

/** Whether drawings are shown unfolded on this device; they are until someone folds one. */
export function drawingsOpen(): boolean {
  if (wished !== null) return wished;
  try {
    return localStorage.getItem(KEY) !== "folded";
  } catch {
    return true;
  }
}

export function keepDrawingsOpen(open: boolean): void {
  wished = open;
  try {
    localStorage.setItem(KEY, open ? "open" : "folded");
  } catch {
    // It holds until the page is left.
  }
  window.dispatchEvent(new Event(CHANGED));
}

/** For useSyncExternalStore. */
export function onDrawingsOpen(notify: () => void): () => void {
  window.addEventListener(CHANGED, notify);
  return () => window.removeEventListener(CHANGED, notify);
}
