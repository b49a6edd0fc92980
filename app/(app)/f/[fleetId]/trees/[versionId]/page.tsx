import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { BackTo } from "@/components/shell/back-to";
import { SymptomIndex } from "@/components/tree/symptom-index";
import { partOf } from "@/components/tree/tree-part";
import { TreeView } from "@/components/tree/tree-view";
import { LinkButton } from "@/components/ui/link-button";
import { PageHead } from "@/components/ui/page-head";
import { getTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../known-id";

type Props = PageProps<"/f/[fleetId]/trees/[versionId]">;

/** The likeliest causes first; more than these are hard to take in at once. */
const LIKELIEST = 12;

const read = cache((fleetId: string, versionId: string) =>
  pageScope("tree:read", fleetId, (scope) => getTreeVersion(scope, knownId(versionId))),
);

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { fleetId, versionId } = await params;
  const { title, number } = await read(fleetId, versionId);
  return { title: `${title}, version ${number}` };
}

export default async function TreePage({ params, searchParams }: Props) {
  const { fleetId, versionId } = await params;
  const { symptom: asked, all } = await searchParams;
  const { document: tree, title, number, from } = await read(fleetId, versionId);
  const symptom = typeof asked === "string" ? asked : (tree.symptoms[0]?.key ?? "");
  const part = partOf(tree, symptom, all === undefined ? LIKELIEST : Infinity);
  if (!part) notFound();
  const here = `/f/${fleetId}/trees/${versionId}`;
  const shown = part.graph.causes.length;
  return (
    <>
      <PageHead
        title={title}
        under={`Version ${number}, ${from === "own" ? "of this fleet" : "shipped with Gudgeon"}. ${tree.about}`}
        back={<BackTo href={`/f/${fleetId}/trees`} title="Fault trees" />}
      />
      <div data-wide className="grid gap-6 lg:grid-cols-[15rem_minmax(0,1fr)]">
        <SymptomIndex path={here} tree={tree} here={symptom} />
        <section aria-labelledby="symptom" className="min-w-0">
          <h2 id="symptom">{part.graph.symptom.title}</h2>
          <div className="mb-4 flex flex-wrap items-center gap-x-4 gap-y-2 text-ink-2">
            <p>
              {part.graph.symptom.detail}.{" "}
              {part.graph.folded > 0 ? `The likeliest ${shown} of ${shown + part.graph.folded} causes.` : `${shown} causes.`}
            </p>
            {part.graph.folded > 0 && (
              <LinkButton className="no-print" prefetch={false} scroll={false} href={`${here}?symptom=${symptom}&all=1`}>
                Show all
              </LinkButton>
            )}
            {all !== undefined && shown > LIKELIEST && (
              <LinkButton className="no-print" prefetch={false} scroll={false} href={`${here}?symptom=${symptom}`}>
                Only the likeliest {LIKELIEST}
              </LinkButton>
            )}
          </div>
          <TreeView key={symptom} part={part} />
        </section>
      </div>
    </>
  );
}
