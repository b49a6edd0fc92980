import type { Metadata } from "next";
import Link from "next/link";
import { Day } from "@/components/log/day";
import { Chip } from "@/components/ui/chip";
import { Card } from "@/components/ui/card";
import { EmptyState } from "@/components/ui/empty-state";
import { PageHead } from "@/components/ui/page-head";
import { can } from "@/lib/core/access/permissions";
import { LinkButton } from "@/components/ui/link-button";
import { getCurrentTreeVersion, listTreeVersions } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";

export const metadata: Metadata = { title: "Fault trees" };

export default async function TreesPage({ params }: PageProps<"/f/[fleetId]/trees">) {
  const { fleetId } = await params;
  const { versions, current, mayEdit } = await pageScope("tree:read", fleetId, async (scope) => ({
    versions: await listTreeVersions(scope),
    current: await getCurrentTreeVersion(scope),
    mayEdit: can(scope.actor.roles, "tree:write"),
  }));
  return (
    <>
      <PageHead
        title="Fault trees"
        under="What the questions come from: symptoms, checks, causes, remedies and the links between them. New diagnoses use the version in use; those begun before keep theirs."
      />
      {mayEdit && (
        <p className="mb-4">
          <LinkButton tone="strong" href={`/workshop/${fleetId}`} prefetch={false}>
            Open the workshop
          </LinkButton>
        </p>
      )}
      <Card aria-label="Published versions">
        {versions.length === 0 ? (
          <EmptyState title="No tree is published yet">Without one nothing can be diagnosed.</EmptyState>
        ) : (
          <ul className="divide-y divide-rule">
            {versions.map((version) => (
              <li key={version.id} className="flex flex-wrap items-center gap-x-4 gap-y-1 py-1">
                <Link
                  className="link inline-flex min-h-12 items-center font-semibold"
                  prefetch={false}
                  href={`/f/${fleetId}/trees/${version.id}`}
                >
                  {version.title}, version {version.number}
                </Link>
                {version.id === current.id && <Chip tone="sound">In use</Chip>}
                <span className="text-sm text-ink-2 sm:ml-auto">
                  {version.from === "own" ? "This fleet’s own" : "Shipped with Gudgeon"}, published <Day at={version.publishedAt} />
                </span>
                {version.note && <p className="w-full pb-2 text-sm">{version.note}</p>}
              </li>
            ))}
          </ul>
        )}
      </Card>
    </>
  );
}
