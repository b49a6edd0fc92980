import type { Boat, Engine } from "@/lib/core/contract/engine";

/** The three steps from an empty fleet to a diagnosis, as far as they are done. */
export function newcomerSteps(fleetId: string, boats: readonly Boat[], engines: readonly Engine[]) {
  const boat = boats[0];
  const engine = engines[0];
  return [
    {
      title: "Add a boat",
      why: "A name is enough.",
      done: boat !== undefined,
      href: `/f/${fleetId}/boats/new`,
      go: "Add a boat",
    },
    {
      title: "Add its engine",
      why: "What you do not know can stay open; the questions are then put so that it does not matter.",
      done: engine !== undefined,
      href: boat ? `/f/${fleetId}/boats/${boat.id}/engines/new` : `/f/${fleetId}/boats/new`,
      go: "Add its engine",
    },
    {
      title: "Diagnose a fault",
      why: "Say what the engine does, in your own words. Or write into its log what was done before, so that it is seen when a fault comes back.",
      done: false,
      href: engine ? `/diagnose?fleet=${fleetId}&engine=${engine.id}` : `/diagnose?fleet=${fleetId}`,
      go: "Diagnose a fault",
    },
  ];
}
