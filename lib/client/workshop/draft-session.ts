import { applyEdit } from "@/lib/core/tree/edits/apply-edit";
import { editBetween, undoOf, type Edit } from "@/lib/core/tree/edits/edit";
import { mergeTrees, settle, type Collision } from "@/lib/core/tree/merge-trees";
import { sameValue } from "@/lib/core/tree/same-value";
import type { FaultTree } from "@/lib/core/tree/schema";

/** What the server last said of the draft. */
export type SavedDraft = {
  id: string;
  version: number;
  document: FaultTree;
  /** The shipped version whose content it has taken up. */
  takenUp: string;
};

/** An edit of a session. `took`: with it the content of one shipped version took the place of another's. */
export type SessionEdit = Edit & { took?: { from: string; to: string } };

/**
 * One person's work on the fleet's draft: a value, so that it can be kept on
 * this device whole and taken up again after a reload, a crash or a dead
 * connection.
 */
export type DraftSession = {
  /** The tree as it stands on this screen. */
  readonly tree: FaultTree;
  /** What the server has; whatever of `tree` differs from it waits to be saved. */
  readonly saved: SavedDraft;
  readonly undo: readonly SessionEdit[];
  readonly redo: readonly SessionEdit[];
  /** Fields that another mechanic changed too, each to something else: to be chosen by hand. Until then theirs stands. */
  readonly collisions: readonly Collision[];
  /** The shipped version whose content was taken up since the last save. */
  readonly takesUp?: string;
};

/** More than a long evening's work; what is older can no longer be undone. */
const MOST_UNDO = 500;

export const beginSession = (saved: SavedDraft): DraftSession => ({ tree: saved.document, saved, undo: [], redo: [], collisions: [] });

/** The session after an edit: `to` is the tree as it shall be. Nothing where it says the same. */
export function edited(session: DraftSession, to: FaultTree, says: string): DraftSession {
  const edit = editBetween(session.tree, to, says);
  if (edit.changes.length === 0) return session;
  return { ...session, tree: to, undo: [...session.undo, edit].slice(-MOST_UNDO), redo: [] };
}

/** Takes the last edit back. Refused in words where another mechanic has changed the same since; the edit then leaves the list. */
export function undone(session: DraftSession): { session: DraftSession; refused: string | null } {
  const edit = session.undo.at(-1);
  if (!edit) return { session, refused: null };
  const undo = session.undo.slice(0, -1);
  const applied = applyEdit(session.tree, undoOf(edit));
  if ("refused" in applied) return { session: { ...session, undo }, refused: applied.refused };
  return { session: { ...session, tree: applied.tree, undo, redo: [...session.redo, edit], ...takingUp(edit.took?.from) }, refused: null };
}

/** Makes the edit that was last taken back once more. */
export function redone(session: DraftSession): { session: DraftSession; refused: string | null } {
  const edit = session.redo.at(-1);
  if (!edit) return { session, refused: null };
  const redo = session.redo.slice(0, -1);
  const applied = applyEdit(session.tree, edit);
  if ("refused" in applied) return { session: { ...session, redo }, refused: applied.refused };
  return { session: { ...session, tree: applied.tree, redo, undo: [...session.undo, edit], ...takingUp(edit.took?.to) }, refused: null };
}

const takingUp = (version: string | undefined): { takesUp?: string } => (version === undefined ? {} : { takesUp: version });

/** What waits to be saved, as one edit; null where the server has it all. */
export function unsaved(session: DraftSession): Edit | null {
  const waiting = editBetween(session.saved.document, session.tree, session.undo.at(-1)?.says ?? "Changed");
  return waiting.changes.length === 0 ? null : waiting;
}

/** After a save: the server now has `saved`. What was edited or taken up while it was on its way still waits. */
export function afterSave(session: DraftSession, saved: SavedDraft): DraftSession {
  return { ...session, saved, takesUp: session.takesUp === saved.takenUp ? undefined : session.takesUp };
}

/**
 * The draft has been saved elsewhere meanwhile: both sides are joined. What
 * only one side changed is taken, what both changed differently waits for a choice.
 */
export function joined(session: DraftSession, theirs: SavedDraft): DraftSession {
  const { tree, collisions } = mergeTrees(session.saved.document, session.tree, theirs.document);
  const still = session.collisions.filter((old) => !collisions.some(({ path }) => sameValue(path, old.path)));
  return { ...session, tree, saved: theirs, collisions: [...still, ...collisions] };
}

/** A collision chosen: mine is an edit like any other, theirs needs none. */
export function chosen(session: DraftSession, collision: Collision, choice: "mine" | "theirs"): DraftSession {
  const left = { ...session, collisions: session.collisions.filter((other) => other !== collision) };
  const says = `${collision.node.key}: ${choice === "mine" ? "kept mine" : "took theirs"}`;
  return edited(left, settle(left.tree, collision, collision[choice]), says);
}

/**
 * Takes up a newer shipped tree, this fleet's own changes kept. `base`: the
 * shipped document whose content the draft has taken up before.
 */
export function tookUp(session: DraftSession, base: FaultTree, newer: { id: string; document: FaultTree }): DraftSession {
  const { tree, collisions } = mergeTrees(base, session.tree, newer.document);
  const after = edited(session, tree, "Took up the newer shipped tree");
  const took = { from: session.takesUp ?? session.saved.takenUp, to: newer.id };
  return {
    ...after,
    undo: after === session ? session.undo : after.undo.map((edit, at) => (at === after.undo.length - 1 ? { ...edit, took } : edit)),
    collisions: [...session.collisions, ...collisions],
    takesUp: newer.id,
  };
}

/** Takes in what an earlier draft still had to save when it was closed, and what nobody had chosen yet. */
export function broughtOver(session: DraftSession, earlier: DraftSession): DraftSession {
  const { tree, collisions } = mergeTrees(earlier.saved.document, earlier.tree, session.tree);
  const open = earlier.collisions.filter((old) => !collisions.some(({ path }) => sameValue(path, old.path)));
  return { ...edited(session, tree, "Brought over from the draft before"), collisions: [...session.collisions, ...open, ...collisions] };
}
