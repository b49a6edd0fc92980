import { createHash } from "node:crypto";
import { uuidv7 } from "uuidv7";
import type { Database } from "@/db/client";
import { shippedTreeVersions } from "@/db/schema/trees";
import type { NewEngine } from "@/lib/core/contract/engine";
import type { DiagnosisEvent, EventKind, EventOf } from "@/lib/core/contract/event";
import type { FaultTree } from "@/lib/core/tree/schema";
import { withScope } from "@/lib/server/auth/scope";
import { addBoat } from "@/lib/server/boats/commands";
import { addEngine } from "@/lib/server/engines/commands";
import { addFleet, addPerson, type TestPerson } from "./people";
import { smallTree } from "./small-tree";

let treesShipped = 0;

/** Puts a tree into the database as a shipped version; gives the version's id. */
export async function shipTree(owner: Database, tree: FaultTree = smallTree()): Promise<string> {
  const id = uuidv7();
  const hash = createHash("sha256").update(JSON.stringify(tree)).digest("hex");
  await owner.insert(shippedTreeVersions).values({ id, key: tree.key, title: tree.title, number: ++treesShipped, document: tree, hash });
  return id;
}

export type Afloat = { person: TestPerson; fleetId: string; boatId: string; engineId: string };

/** A person with a fleet, a boat and an engine. */
export async function afloat(name = "Ines", engine: Partial<NewEngine> = {}): Promise<Afloat> {
  const person = await addPerson({ name });
  const fleetId = await addFleet(`${name}'s boats`, person);
  const [boatId, engineId] = [uuidv7(), uuidv7()];
  await withScope(person, fleetId, "boat:write", (scope) => addBoat(scope, { id: boatId, name: "Petrel", callMinutes: {} }));
  await addEngineTo({ person, fleetId, boatId, engineId }, engine);
  return { person, fleetId, boatId, engineId };
}

export async function addEngineTo({ person, fleetId, boatId, engineId }: Afloat, engine: Partial<NewEngine> = {}): Promise<void> {
  const whole: NewEngine = {
    id: engineId,
    boatId,
    name: "main engine",
    hasHourMeter: true,
    profile: { features: {}, figures: {}, healthy: {} },
    ...engine,
  };
  await withScope(person, fleetId, "engine:write", (scope) => addEngine(scope, whole));
}

/** Writes events of one diagnosis as a phone does: its own id, its own count, and what it has seen of the others. */
export function phoneOf(diagnosisId: string, startsAt = "2026-06-01T10:00:00.000Z") {
  const device = uuidv7();
  let sequence = 0;
  const write = <K extends EventKind>(
    kind: K,
    payload: EventOf<K>["payload"],
    rest: Partial<Pick<DiagnosisEvent, "seen" | "supersedes" | "madeAt">> = {},
  ): EventOf<K> => {
    sequence += 1;
    const madeAt = new Date(Date.parse(startsAt) + sequence * 60_000).toISOString();
    return { id: uuidv7(), diagnosisId, device, sequence, madeAt, seen: {}, kind, payload, ...rest } as EventOf<K>;
  };
  return {
    device,
    write,
    begin: (engineId: string, treeVersionId: string, payload: Partial<EventOf<"begun">["payload"]> = {}) =>
      write("begun", {
        engineId,
        treeVersionId,
        profile: { features: {}, figures: {}, healthy: {} },
        situation: "alongside",
        person: "skipper-at-sea",
        symptoms: ["lost-rpm"],
        multipliers: [],
        coreVersion: 1,
        ...payload,
      }),
  };
}
