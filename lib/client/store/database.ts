import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { DiagnosisEvent } from "@/lib/core/contract/event";
import type { Phone } from "@/lib/core/contract/phone";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Draft } from "./draft";

/** An event on this phone. `unsent` is 1 until the server has it, then absent, so that the index holds the outbox alone. */
export type KeptEvent = { event: DiagnosisEvent; unsent?: 1; rejected?: string };

export type KeptPhoto = { id: string; blob: Blob; unsent?: 1; rejected?: string };

export interface StoreShape extends DBSchema {
  events: { key: string; value: KeptEvent; indexes: { diagnosis: string; unsent: number } };
  photos: { key: string; value: KeptPhoto; indexes: { unsent: number } };
  trees: { key: string; value: { id: string; tree: FaultTree } };
  facts: { key: "phone"; value: { phone: Phone; at: string } };
  drafts: { key: string; value: Draft };
}

export type Connection = IDBPDatabase<StoreShape>;

/**
 * One connection to the store of a person in a fleet. Phones close database
 * handles behind a sleeping page's back, after which every write fails without a
 * word; so the handle is opened anew when it has gone, and the work tried once more.
 */
export class Database {
  readonly #name: string;
  #connection: Promise<Connection> | null = null;

  constructor(userId: string, fleetId: string) {
    this.#name = `gudgeon.${userId}.${fleetId}`;
  }

  async run<T>(work: (connection: Connection) => Promise<T>): Promise<T> {
    try {
      return await work(await this.#open());
    } catch (failure) {
      if (!isClosed(failure)) throw failure;
      this.#connection = null;
      return await work(await this.#open());
    }
  }

  #open(): Promise<Connection> {
    this.#connection ??= openDB<StoreShape>(this.#name, 1, {
      upgrade(connection) {
        const events = connection.createObjectStore("events", { keyPath: "event.id" });
        events.createIndex("diagnosis", "event.diagnosisId");
        events.createIndex("unsent", "unsent");
        connection.createObjectStore("photos", { keyPath: "id" }).createIndex("unsent", "unsent");
        connection.createObjectStore("trees", { keyPath: "id" });
        connection.createObjectStore("facts");
        connection.createObjectStore("drafts", { keyPath: "engineId" });
      },
      blocking: (_current, _blocked, event) => {
        (event.target as IDBDatabase).close();
        this.#connection = null;
      },
      terminated: () => {
        this.#connection = null;
      },
    }).catch((failure: unknown) => {
      this.#connection = null;
      throw failure;
    });
    return this.#connection;
  }
}

/** InvalidStateError is what a closed handle throws; UnknownError and AbortError come from a handle that dies under the work. */
function isClosed(failure: unknown): boolean {
  return failure instanceof DOMException && ["InvalidStateError", "UnknownError", "AbortError"].includes(failure.name);
}
