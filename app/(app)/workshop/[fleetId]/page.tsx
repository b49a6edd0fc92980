import type { Metadata } from "next";
import { WorkshopDoor } from "@/components/workshop/workshop-door";
import { getCurrentTreeVersion, listTreeVersions } from "@/lib/server/trees/queries";
import { pageScope, signedInPerson } from "@/lib/server/web/page-scope";

export const metadata: Metadata = { title: "Workshop" };

/** Outside the fleet's frame: the picture needs the whole width. */
export default async function WorkshopPage({ params }: PageProps<"/workshop/[fleetId]">) {
  const { fleetId } = await params;
  const { current, versions } = await pageScope("tree:write", fleetId, async (scope) => ({
    current: await getCurrentTreeVersion(scope),
    versions: await listTreeVersions(scope),
  }));
  const person = await signedInPerson(`/workshop/${fleetId}`);
  const newestShipped = versions.find(({ from }) => from === "shipped") ?? null;
  return <WorkshopDoor fleetId={fleetId} userId={person.userId} current={current} newestShipped={newestShipped} />;
}
