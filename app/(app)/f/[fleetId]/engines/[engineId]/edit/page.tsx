import type { Metadata } from "next";
import { EngineForm } from "@/components/engine/engine-form";
import { RemoveThing } from "@/components/form/remove-thing";
import { BackTo } from "@/components/shell/back-to";
import { PageHead } from "@/components/ui/page-head";
import { can } from "@/lib/core/access/permissions";
import { getEngine } from "@/lib/server/engines/queries";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../known-id";

export const metadata: Metadata = { title: "Engine profile" };

export default async function EditEnginePage({ params }: PageProps<"/f/[fleetId]/engines/[engineId]/edit">) {
  const { fleetId, engineId } = await params;
  const { engine, tree, mayRemove } = await pageScope("engine:write", fleetId, async (scope) => ({
    engine: await getEngine(scope, knownId(engineId)),
    tree: await documentOf(scope, await getCurrentTreeVersion(scope)),
    mayRemove: can(scope.actor.roles, "boat:remove"),
  }));
  const title = `${engine.boatName} · ${engine.name}`;
  return (
    <>
      <PageHead
        title={`${title}: profile`}
        under="What the engine is. It decides which checks make sense on it."
        back={<BackTo href={`/f/${fleetId}/engines/${engine.id}`} title={title} />}
      />
      <EngineForm fleetId={fleetId} engine={engine} features={tree.features} />
      {mayRemove && (
        <div className="no-print mt-10 border-t border-rule pt-5">
          <RemoveThing
            title={`Remove ${engine.name}`}
            path={`/api/v1/fleets/${fleetId}/engines/${engine.id}`}
            version={engine.version}
            then={`/f/${fleetId}/boats/${engine.boatId}`}
          >
            <p>
              {engine.name} of {engine.boatName} goes off the lists. What was logged stays in the log and can still be read.
            </p>
          </RemoveThing>
        </div>
      )}
    </>
  );
}
