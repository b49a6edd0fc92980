import type { Metadata } from "next";
import { NewBoatForm } from "@/components/fleet/new-boat-form";
import { BackTo } from "@/components/shell/back-to";
import { PageHead } from "@/components/ui/page-head";
import { pageScope } from "@/lib/server/web/page-scope";

export const metadata: Metadata = { title: "Add a boat" };

export default async function NewBoatPage({ params }: PageProps<"/f/[fleetId]/boats/new">) {
  const { fleetId } = await params;
  await pageScope("boat:write", fleetId, async () => undefined);
  return (
    <>
      <PageHead title="Add a boat" back={<BackTo href={`/f/${fleetId}`} title="Boats and engines" />} />
      <NewBoatForm fleetId={fleetId} />
    </>
  );
}
