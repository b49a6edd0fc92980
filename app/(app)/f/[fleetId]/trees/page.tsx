import type { Metadata } from "next";
import Link from "next/link";
import { Day } from "@/components/log/day";
import { Chip } from "@/components/ui/chip";
import { Card } from "@/components/ui/card";
import { EmptyState } from "@/components/ui/empty-state";
import { PageHead } from "@/components/ui/page-head";
import { Table, type Column } from "@/components/ui/table";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
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
  const columns: Column<TreeVersionInfo>[] = [
    {
      key: "tree",
      title: "Tree",
      cell: (v) => (
        <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/trees/${v.id}`}>
          {v.title}
        </Link>
      ),
    },
    { key: "number", title: "Version", figure: true, cell: (v) => v.number },
    { key: "published", title: "Published", cell: (v) => <Day at={v.publishedAt} /> },
    { key: "from", title: "From", cell: (v) => (v.from === "own" ? "this fleet" : "shipped with Gudgeon") },
    { key: "note", title: "What changed", cell: (v) => v.note ?? "" },
    { key: "use", title: "Standing", cell: (v) => (v.id === current.id ? <Chip tone="sound">In use</Chip> : "") },
  ];
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
      <Card>
        <Table
          caption="Published versions"
          hideCaption
          columns={columns}
          rows={versions}
          rowKey={(v) => v.id}
          empty={<EmptyState title="No tree is published yet">Without one nothing can be diagnosed.</EmptyState>}
        />
      </Card>
    </>
  );
}
