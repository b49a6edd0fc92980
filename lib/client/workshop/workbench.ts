import { uuidv7 } from "uuidv7";
import { TreeDraft } from "@/lib/core/contract/draft";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Collision } from "@/lib/core/tree/merge-trees";
import { backoffSeconds } from "../exchange/backoff";
import { NoAnswer, request, sendJson } from "../exchange/request";
import { Observable } from "../observable";
import {
  afterSave,
  beginSession,
  broughtOver,
  chosen,
  edited,
  joined,
  redone,
  tookUp,
  undone,
  unsaved,
  type DraftSession,
  type SavedDraft,
} from "./draft-session";
import type { SessionKeeper } from "./session-keeper";

/** What the head of the workshop says of saving. */
export type Saving =
  | { state: "saved"; at: string }
  | { state: "waiting" }
  | { state: "saving" }
  /** Kept on this device; tried again by itself. */
  | { state: "no-signal" }
  | { state: "signed-out" }
  /** The server will not have it, and says why: nothing is lost, but it has to be mended by hand. */
  | { state: "refused"; because: string; errors: readonly { path: string; says: string }[] }
  /** The draft was published or given up by somebody else. */
  | { state: "gone" };

const QUIET_MS = 800;

/**
 * A mechanic's work on the fleet's draft: every edit is drawn and kept on this
 * device at once, and saved after a moment of quiet with the version that it
 * was made to. Nobody's edit is written over, and none is lost.
 */
export class Workbench {
  readonly session: Observable<DraftSession>;
  readonly saving: Observable<Saving>;
  /** What the last undo or redo was refused for. */
  readonly refused = new Observable<string | null>(null);
  readonly #path: string;
  readonly #keeper: SessionKeeper;
  #timer: ReturnType<typeof setTimeout> | null = null;
  #failures = 0;
  #running: Promise<void> | null = null;
  #closed = false;

  constructor(fleetId: string, keeper: SessionKeeper, session: DraftSession, savedAt: string) {
    this.#path = `/api/v1/fleets/${fleetId}/trees/draft`;
    this.#keeper = keeper;
    this.session = new Observable(session);
    this.saving = new Observable<Saving>({ state: "saved", at: savedAt });
    if (unsaved(session)) this.#later(0);
  }

  edit(to: FaultTree, says: string): void {
    this.refused.set(null);
    this.#put(edited(this.session.get(), to, says));
  }

  undo(): void {
    const { session, refused } = undone(this.session.get());
    this.refused.set(refused);
    this.#put(session);
  }

  redo(): void {
    const { session, refused } = redone(this.session.get());
    this.refused.set(refused);
    this.#put(session);
  }

  choose(collision: Collision, choice: "mine" | "theirs"): void {
    this.#put(chosen(this.session.get(), collision, choice));
  }

  takeUp(base: FaultTree, newer: { id: string; document: FaultTree }): void {
    this.#put(tookUp(this.session.get(), base, newer));
  }

  /** Saves what waits now, and settles when the server has it or has refused it. */
  async saveNow(): Promise<void> {
    if (this.#timer) clearTimeout(this.#timer);
    await this.#running;
    await this.#start();
  }

  /**
   * An answer told that the draft has been saved elsewhere: `now` is what it says there. It is joined with what stands
   * here. Not a draft, or one that cannot be read, is left alone.
   */
  takeIn(now: unknown): boolean {
    const theirs = TreeDraft.safeParse(now);
    if (!theirs.success) return false;
    // Another draft under the same address: this one was published or given up, and somebody has begun the next.
    if (theirs.data.id !== this.session.get().saved.id) {
      this.saving.set({ state: "gone" });
      return true;
    }
    this.#put(joined(this.session.get(), savedOf(theirs.data)));
    return true;
  }

  /** A signal has come back, or somebody looks at the page again. */
  nudge(): void {
    this.#failures = 0;
    if (unsaved(this.session.get())) this.#later(0);
  }

  /** Published or given up: what this device kept of it has done its work. */
  async forget(): Promise<void> {
    this.close();
    await this.#keeper.forget(this.session.get().saved.id).catch((failure: unknown) => console.error(failure));
  }

  /** Stops trying; what waits stays on this device. */
  close(): void {
    this.#closed = true;
    if (this.#timer) clearTimeout(this.#timer);
  }

  #put(session: DraftSession): void {
    if (session === this.session.get()) return;
    this.session.set(session);
    void this.#keeper.keep(session).catch((failure: unknown) => console.error(failure));
    if (unsaved(session)) {
      this.saving.set({ state: "waiting" });
      this.#later(QUIET_MS);
    }
  }

  #later(ms: number): void {
    if (this.#timer) clearTimeout(this.#timer);
    if (this.#closed) return;
    this.#timer = setTimeout(() => void this.#start(), ms);
  }

  #start(): Promise<void> {
    this.#running ??= this.#run().finally(() => {
      this.#running = null;
    });
    return this.#running;
  }

  async #run(): Promise<void> {
    for (let edit = unsaved(this.session.get()); edit !== null; edit = unsaved(this.session.get())) {
      this.saving.set({ state: "saving" });
      const { saved, takesUp } = this.session.get();
      try {
        const answer = TreeDraft.parse(
          await sendJson(
            this.#path,
            { draft: saved.id, ...edit, ...(takesUp ? { takesUp } : {}) },
            { method: "PATCH", version: saved.version },
          ),
        );
        this.#put(afterSave(this.session.get(), savedOf(answer)));
        this.#failures = 0;
        this.saving.set({ state: "saved", at: answer.savedAt });
      } catch (failure) {
        if (!(failure instanceof NoAnswer && failure.status === 412 && this.takeIn(failure.current))) return this.#failed(failure);
        if (this.saving.get().state === "gone") return;
      }
    }
  }

  #failed(failure: unknown): void {
    if (!(failure instanceof NoAnswer)) {
      console.error(failure);
      return this.saving.set({ state: "refused", because: "The server's answer could not be read.", errors: [] });
    }
    if (failure.status === 401) return this.saving.set({ state: "signed-out" });
    if (failure.status === 404 && failure.fromServer) return this.saving.set({ state: "gone" });
    if (failure.isNoSignal || failure.status >= 500) {
      this.saving.set({ state: "no-signal" });
      return this.#later(backoffSeconds(++this.#failures, Math.random()) * 1000);
    }
    this.saving.set({ state: "refused", because: failure.because, errors: failure.errors });
  }
}

const savedOf = ({ id, version, document, takenUp }: TreeDraft): SavedDraft => ({ id, version, document, takenUp });

/**
 * Opens the fleet's draft, or begins it from `versionId` where there is none,
 * and takes up what this device still keeps of it.
 *
 * @throws NoAnswer
 */
export async function openWorkbench(fleetId: string, keeper: SessionKeeper, versionId: string): Promise<Workbench> {
  const path = `/api/v1/fleets/${fleetId}/trees/draft`;
  const answer = TreeDraft.parse(
    await request(path).catch((failure: unknown) => {
      if (failure instanceof NoAnswer && failure.status === 404) return sendJson(path, { id: uuidv7(), versionId });
      throw failure;
    }),
  );
  return resumeWorkbench(fleetId, keeper, answer);
}

/**
 * As openWorkbench, with the draft at hand. Work on an earlier draft that the
 * server never got, since that one was published or given up, is brought into
 * this one as an edit that can be undone.
 */
export async function resumeWorkbench(fleetId: string, keeper: SessionKeeper, draft: TreeDraft): Promise<Workbench> {
  const kept = await keeper.read(draft.id).catch(() => null);
  let session = kept === null ? beginSession(savedOf(draft)) : kept.saved.version === draft.version ? kept : joined(kept, savedOf(draft));
  for (const id of await keeper.draftIds().catch(() => [])) {
    const earlier = id === draft.id ? null : await keeper.read(id);
    if (earlier && (unsaved(earlier) || earlier.collisions.length > 0)) session = broughtOver(session, earlier);
    if (earlier) {
      await keeper.keep(session);
      await keeper.forget(id);
    }
  }
  return new Workbench(fleetId, keeper, session, draft.savedAt);
}
