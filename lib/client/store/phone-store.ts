import { uuidv7 } from "uuidv7";
import type { DiagnosisEvent, EventKind, EventOf } from "@/lib/core/contract/event";
import type { Phone } from "@/lib/core/contract/phone";
import type { FaultTree } from "@/lib/core/tree/schema";
import { Observable } from "../observable";
import { Database, type KeptEvent, type KeptPhoto } from "./database";
import type { Draft } from "./draft";
import { stamp } from "./stamp";
import { summarize, type Summary } from "./summary";

/**
 * What one person has of one fleet on this phone. Everything the skipper's path
 * shows is read from here, and every tap is written here before anything else.
 */
export class PhoneStore {
  readonly device: string;
  /** Counts up with every change of events, here or in another tab. */
  readonly changes = new Observable(0);
  /** Counts up when the fleet or a tree on this phone is renewed. */
  readonly factsChanges = new Observable(0);
  /** True while the last write did not reach the disk: the screen says so. */
  readonly unsaved = new Observable(false);
  readonly #database: Database;
  readonly #channel: BroadcastChannel | null;
  /** Events whose write failed: shown, used, and written again with the next one. Once sent they stay here, so that their numbers are not given out twice. */
  #homeless: readonly KeptEvent[] = [];

  constructor(userId: string, fleetId: string, device: string) {
    this.device = device;
    this.#database = new Database(userId, fleetId);
    this.#channel = typeof BroadcastChannel === "undefined" ? null : new BroadcastChannel(`gudgeon.${userId}.${fleetId}`);
    if (this.#channel) this.#channel.onmessage = () => this.changes.set(this.changes.get() + 1);
  }

  /** Writes down what was tapped. The number is taken inside the transaction, so that two tabs never share one. */
  async record<K extends EventKind>(
    diagnosisId: string,
    kind: K,
    payload: EventOf<K>["payload"],
    supersedes?: string,
  ): Promise<EventOf<K>> {
    const id = uuidv7();
    const make = (known: readonly DiagnosisEvent[]): EventOf<K> =>
      ({
        id,
        diagnosisId,
        device: this.device,
        ...stamp(known, this.device),
        madeAt: new Date().toISOString(),
        kind,
        payload,
        ...(supersedes ? { supersedes } : {}),
      }) as EventOf<K>;
    const homeless = this.#homeless;
    try {
      const event = await this.#database.run(async (connection) => {
        const transaction = connection.transaction("events", "readwrite", { durability: "strict" });
        for (const kept of homeless) await transaction.store.put(kept);
        const kept = await transaction.store.index("diagnosis").getAll(diagnosisId);
        // A handle may die after the write and before its word of it; the second try then finds it written.
        const written = kept.find(({ event }) => event.id === id)?.event as EventOf<K> | undefined;
        const made = written ?? make(kept.map(({ event }) => event));
        if (!written) await transaction.store.add({ event: made, unsent: 1 });
        await transaction.done;
        return made;
      });
      this.#homeless = this.#homeless.filter((kept) => !homeless.includes(kept));
      this.unsaved.set(this.#homeless.length > 0);
      this.#tell();
      return event;
    } catch {
      const known = (await this.events(diagnosisId)).map((kept) => kept.event);
      const event = make(known);
      this.#homeless = [...this.#homeless, { event, unsent: 1 }];
      this.unsaved.set(true);
      this.#tell();
      return event;
    }
  }

  async events(diagnosisId: string): Promise<KeptEvent[]> {
    const onDisk = await this.#database.run((connection) => connection.getAllFromIndex("events", "diagnosis", diagnosisId)).catch(() => []);
    return this.#withHomeless(onDisk).filter((kept) => kept.event.diagnosisId === diagnosisId);
  }

  async summaries(): Promise<Summary[]> {
    const all = await this.#database.run((connection) => connection.getAll("events")).catch(() => []);
    const byDiagnosis = new Map<string, DiagnosisEvent[]>();
    for (const { event } of this.#withHomeless(all))
      byDiagnosis.set(event.diagnosisId, [...(byDiagnosis.get(event.diagnosisId) ?? []), event]);
    return [...byDiagnosis.values()]
      .map(summarize)
      .filter((summary) => summary !== null)
      .sort((a, b) => b.touchedAt.localeCompare(a.touchedAt));
  }

  /** Takes in events that other devices, or this one before, gave to the server. What waits to be sent here stays waiting. */
  async takeIn(events: readonly DiagnosisEvent[]): Promise<void> {
    const added = await this.#database.run(async (connection) => {
      const transaction = connection.transaction("events", "readwrite");
      let count = 0;
      for (const event of events) {
        if (await transaction.store.getKey(event.id)) continue;
        await transaction.store.add({ event });
        count += 1;
      }
      await transaction.done;
      return count;
    });
    if (added > 0) this.#tell();
  }

  async unsentEvents(): Promise<KeptEvent[]> {
    const onDisk = await this.#database.run((connection) => connection.getAllFromIndex("events", "unsent", 1)).catch(() => []);
    return this.#withHomeless(onDisk).filter(({ unsent }) => unsent === 1);
  }

  #withHomeless(onDisk: readonly KeptEvent[]): KeptEvent[] {
    const there = new Set(onDisk.map(({ event }) => event.id));
    return [...onDisk, ...this.#homeless.filter(({ event }) => !there.has(event.id))];
  }

  /** The server has them, or has said why it will not: either way they leave the outbox and stay in the log. */
  async settle(receipts: readonly { id: string; rejected?: string }[]): Promise<void> {
    const settled = new Map(receipts.map(({ id, rejected }) => [id, rejected === undefined ? {} : { rejected }]));
    this.#homeless = this.#homeless.map((kept) => {
      const mark = settled.get(kept.event.id);
      return mark ? { event: kept.event, ...mark } : kept;
    });
    await this.#database.run(async (connection) => {
      const transaction = connection.transaction("events", "readwrite");
      for (const [id, mark] of settled) {
        const kept = await transaction.store.get(id);
        if (kept) await transaction.store.put({ event: kept.event, ...mark });
      }
      await transaction.done;
    });
    this.#tell();
  }

  /** Keeps a picture for the server. @throws Error with words to show where there is no room for it */
  async addPhoto(blob: Blob): Promise<string> {
    const id = uuidv7();
    try {
      await this.#database.run((connection) => connection.put("photos", { id, blob, unsent: 1 }));
    } catch {
      throw new Error("This picture could not be kept: the phone's storage may be full. The answer can be given without it.");
    }
    this.#tell();
    return id;
  }

  photo(id: string): Promise<KeptPhoto | undefined> {
    return this.#database.run((connection) => connection.get("photos", id)).catch(() => undefined);
  }

  unsentPhotos(): Promise<KeptPhoto[]> {
    return this.#database.run((connection) => connection.getAllFromIndex("photos", "unsent", 1)).catch(() => []);
  }

  async settlePhoto(id: string, rejected?: string): Promise<void> {
    const kept = await this.photo(id);
    if (kept)
      await this.#database.run((connection) =>
        connection.put("photos", { id, blob: kept.blob, ...(rejected === undefined ? {} : { rejected }) }),
      );
    this.#tell();
  }

  phone(): Promise<{ phone: Phone; at: string } | undefined> {
    return this.#database.run((connection) => connection.get("facts", "phone")).catch(() => undefined);
  }

  async keepPhone(phone: Phone): Promise<void> {
    await this.#database.run((connection) => connection.put("facts", { phone, at: new Date().toISOString() }, "phone"));
    this.factsChanges.set(this.factsChanges.get() + 1);
  }

  async tree(versionId: string): Promise<FaultTree | undefined> {
    return (await this.#database.run((connection) => connection.get("trees", versionId)).catch(() => undefined))?.tree;
  }

  async keepTree(id: string, tree: FaultTree): Promise<void> {
    await this.#database.run((connection) => connection.put("trees", { id, tree }));
    this.factsChanges.set(this.factsChanges.get() + 1);
  }

  draft(engineId: string): Promise<Draft | undefined> {
    return this.#database.run((connection) => connection.get("drafts", engineId)).catch(() => undefined);
  }

  keepDraft(draft: Draft): Promise<void> {
    return this.#write((connection) => connection.put("drafts", draft));
  }

  async dropDraft(engineId: string): Promise<void> {
    await this.#database.run((connection) => connection.delete("drafts", engineId)).catch(() => undefined);
  }

  async #write(work: Parameters<Database["run"]>[0]): Promise<void> {
    try {
      await this.#database.run(work);
      this.unsaved.set(this.#homeless.length > 0);
    } catch {
      this.unsaved.set(true);
    }
  }

  #tell(): void {
    this.changes.set(this.changes.get() + 1);
    this.#channel?.postMessage("changed");
  }
}
