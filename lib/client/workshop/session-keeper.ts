import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { DraftSession } from "./draft-session";

interface Shape extends DBSchema {
  sessions: { key: string; value: DraftSession };
}

/** Keeps a person's work on a fleet's draft on this device until the server has it, and what can be undone beyond that. */
export class SessionKeeper {
  readonly #name: string;
  #opened: Promise<IDBPDatabase<Shape>> | null = null;

  constructor(userId: string, fleetId: string) {
    this.#name = `gudgeon.workshop.${userId}.${fleetId}`;
  }

  /** The work on this draft as it was kept; null where there is none, or it cannot be read. */
  async read(draftId: string): Promise<DraftSession | null> {
    return (await (await this.#open()).get("sessions", draftId)) ?? null;
  }

  /** Drafts with work kept on this device. */
  async draftIds(): Promise<string[]> {
    return (await this.#open()).getAllKeys("sessions");
  }

  async keep(session: DraftSession): Promise<void> {
    await (await this.#open()).put("sessions", session, session.saved.id);
  }

  async forget(draftId: string): Promise<void> {
    await (await this.#open()).delete("sessions", draftId);
  }

  #open(): Promise<IDBPDatabase<Shape>> {
    this.#opened ??= openDB<Shape>(this.#name, 1, { upgrade: (database) => void database.createObjectStore("sessions") });
    return this.#opened;
  }
}
