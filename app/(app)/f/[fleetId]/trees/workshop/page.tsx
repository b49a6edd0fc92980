import type { Metadata } from "next";
import { BackTo } from "@/components/shell/back-to";
import { WorkshopDoor } from "@/components/workshop/workshop-door";
import { getCurrentTreeVersion, listTreeVersions } from "@/lib/server/trees/queries";
import { pageScope, signedInPerson } from "@/lib/server/web/page-scope";

export const metadata: Metadata = { title: "Workshop" };

export default async function WorkshopPage({ params }: PageProps<"/f/[fleetId]/trees/workshop">) {
  const { fleetId } = await params;
  const { current, versions } = await pageScope("tree:write", fleetId, async (scope) => ({
    current: await getCurrentTreeVersion(scope),
    versions: await listTreeVersions(scope),
  }));
  const person = await signedInPerson(`/f/${fleetId}`);
  const newestShipped = versions.find(({ from }) => from === "shipped") ?? null;
  return (
    <div data-wide>
      <BackTo href={`/f/${fleetId}/trees`} title="Fault trees" />
      <WorkshopDoor fleetId={fleetId} userId={person.userId} current={current} newestShipped={newestShipped} />
    </div>
  );
}
