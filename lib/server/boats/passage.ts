import "server-only";
import type { Engine } from "@/lib/core/contract/engine";
import type { PassageLine, PassageQuery } from "@/lib/core/contract/passage";
import { historiesOf } from "@/lib/core/recurrence/spells";
import type { Watched } from "@/lib/core/recurrence/constant-rate";
import type { FaultTree } from "@/lib/core/tree/schema";
import { planPassage, type PlannedEngine } from "@/lib/core/upkeep/passage-plan";
import { starterPlan } from "@/lib/core/upkeep/starter-plan";
import type { FleetScope } from "@/lib/server/auth/scope";
import { listEngines } from "@/lib/server/engines/queries";
import { readHistory } from "@/lib/server/log/lines";
import { watchedEngines } from "@/lib/server/log/watched-engines";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { getBoat } from "./queries";

/** What to carry on a boat for a passage, by the fleet's tree, its log and the usual upkeep. */
export async function planForBoat(scope: FleetScope, boatId: string, asked: PassageQuery): Promise<PassageLine[]> {
  await getBoat(scope, boatId);
  const engines = (await listEngines(scope)).filter((engine) => engine.boatId === boatId);
  const tree = await documentOf(scope, await getCurrentTreeVersion(scope));
  const countsOn = await countsOfFleet(scope);
  const passage = {
    hours: asked.hours,
    litres: asked.litres,
    months: asked.months,
    dirtyTank: asked.dirtyLitres
      ? {
          litres: asked.dirtyLitres,
          seen: asked.clogged !== undefined && asked.cloggedLitres ? { elements: asked.clogged, litres: asked.cloggedLitres } : undefined,
        }
      : undefined,
  };
  const groups = alike(engines);
  return groups.flatMap((group) =>
    planPassage(
      tree,
      group.map((engine) => planned(engine, tree, countsOn)),
      passage,
    ).map(({ part, title, mean, carry, reasons }) => ({
      ...{ part, title, mean, carry },
      fits: groups.length > 1 ? group.map(({ name }) => name).join(", ") : null,
      reasons: [...reasons],
    })),
  );
}

/** Engines that take the same parts: of one maker and model. Where either is not known an engine stands alone. */
function alike(engines: readonly Engine[]): Engine[][] {
  const groups = new Map<string, Engine[]>();
  for (const engine of engines) {
    const { maker, model } = engine.profile;
    const key = maker && model ? `${maker} ${model}`.toLowerCase() : engine.id;
    groups.set(key, [...(groups.get(key) ?? []), engine]);
  }
  return [...groups.values()];
}

/** Four where the profile does not say: too many plugs rather than too few. */
const USUAL_CYLINDERS = 4;

function planned(engine: Engine, tree: FaultTree, countsOn: CountsOn): PlannedEngine {
  const { counts, now } = countsOn(engine.id);
  return {
    id: engine.id,
    name: engine.name,
    cylinders: engine.profile.cylinders ?? USUAL_CYLINDERS,
    now,
    items: starterPlan(engine.profile, tree.features),
    done: [],
    counts,
  };
}

type CountsOn = (engineId: string) => Pick<PlannedEngine, "counts" | "now">;

/** How often each cause was had, and over how many hours, on one engine and on all others. Engines whose hours are not known count for nothing. */
async function countsOfFleet(scope: FleetScope): Promise<CountsOn> {
  const history = await readHistory(scope, {});
  const now = new Date().toISOString();
  const spans = new Map(
    watchedEngines(history, now).map(({ id, since, clock }) => {
      const [from, to] = [clock.at(since).hours, clock.at(now).hours];
      return [id, { since, sinceHours: from, hours: to, time: from === null || to === null ? 0 : Math.max(0, to - from) }];
    }),
  );
  const faults = new Map<string, number>();
  const add = (key: string, more: number) => faults.set(key, (faults.get(key) ?? 0) + more);
  for (const { engineId, cause, spells } of historiesOf(history.cases)) {
    if (!spans.get(engineId)?.time) continue;
    add(`${engineId} ${cause}`, spells.length);
    add(cause, spells.length);
  }
  const all = [...spans.values()].reduce((sum, { time }) => sum + time, 0);
  return (engineId) => {
    const span = spans.get(engineId);
    return {
      now: { now, hours: span?.hours ?? null, since: span?.since ?? now, sinceHours: span?.sinceHours ?? null },
      counts: (cause) => {
        const own: Watched = { faults: faults.get(`${engineId} ${cause}`) ?? 0, time: span?.time ?? 0 };
        return { own, others: { faults: (faults.get(cause) ?? 0) - own.faults, time: all - own.time } };
      },
    };
  };
}
