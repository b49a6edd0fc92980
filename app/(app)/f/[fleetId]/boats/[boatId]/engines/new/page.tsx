import type { Metadata } from "next";
import { NewEngineForm } from "@/components/engine/new-engine-form";
import { BackTo } from "@/components/shell/back-to";
import { PageHead } from "@/components/ui/page-head";
import { getBoat } from "@/lib/server/boats/queries";
import { listEngines } from "@/lib/server/engines/queries";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../../known-id";

export const metadata: Metadata = { title: "Add an engine" };

export default async function NewEnginePage({ params }: PageProps<"/f/[fleetId]/boats/[boatId]/engines/new">) {
  const { fleetId, boatId } = await params;
  const { boat, others, tree } = await pageScope("engine:write", fleetId, async (scope) => ({
    boat: await getBoat(scope, knownId(boatId)),
    others: (await listEngines(scope)).filter((engine) => engine.boatId === boatId),
    tree: await documentOf(scope, await getCurrentTreeVersion(scope)),
  }));
  return (
    <>
      <PageHead
        title={`Add an engine to ${boat.name}`}
        under="A name is enough to begin."
        back={<BackTo href={`/f/${fleetId}/boats/${boat.id}`} title={boat.name} />}
      />
      {/* A key of its own for each engine: the form begins afresh for the second of twins. */}
      <NewEngineForm
        key={others.length}
        fleetId={fleetId}
        boatId={boat.id}
        suggestedName={others.length === 0 ? "Main engine" : ""}
        first={others.length === 0}
        features={tree.features}
      />
    </>
  );
}
