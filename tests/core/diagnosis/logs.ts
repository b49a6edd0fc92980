import type { DiagnosisEvent, EventKind, EventOf } from "../../../lib/core/contract/event";

const uuid = (device: number, sequence: number): string =>
  `0197${String(device).padStart(4, "0")}-0000-7000-8000-${String(sequence).padStart(12, "0")}`;
export const deviceId = (device: number): string => uuid(device, 0);

type Told = { seen?: Record<string, number>; supersedes?: string };

/** Writes a log as devices do: each counts for itself, and sees another only when told so. */
export class Device {
  #sequence = 0;
  constructor(readonly number: number) {}

  get id(): string {
    return deviceId(this.number);
  }

  get count(): number {
    return this.#sequence;
  }

  tell<K extends EventKind>(kind: K, payload: EventOf<K>["payload"], { seen = {}, supersedes }: Told = {}): EventOf<K> {
    const sequence = ++this.#sequence;
    const event = {
      id: uuid(this.number, sequence),
      diagnosisId: uuid(999, 1),
      device: this.id,
      sequence,
      madeAt: "2025-06-01T10:00:00Z",
      seen,
      kind,
      payload,
      ...(supersedes === undefined ? {} : { supersedes }),
    };
    return event as unknown as EventOf<K>;
  }

  begin(over: Partial<EventOf<"begun">["payload"]> = {}): EventOf<"begun"> {
    return this.tell("begun", {
      engineId: uuid(900, 1),
      treeVersionId: uuid(901, 1),
      profile: { features: {}, figures: {}, healthy: {} },
      situation: "alongside",
      person: "skipper-in-port",
      symptoms: [],
      multipliers: [],
      coreVersion: 1,
      ...over,
    });
  }

  answer(check: string, finding: string, told: Told = {}): EventOf<"answered"> {
    return this.tell("answered", { check, answer: { finding }, photos: [] }, told);
  }

  tried(remedy: string, result: EventOf<"remedy-tried">["payload"]["result"], told: Told = {}): EventOf<"remedy-tried"> {
    return this.tell("remedy-tried", { remedy, result, photos: [] }, told);
  }
}

export const all = (...events: DiagnosisEvent[]): DiagnosisEvent[] => events;
