import type { Metadata } from "next";
import Link from "next/link";
import { cache } from "react";
import { Moment } from "@/components/log/moment";
import { OutcomeCard } from "@/components/log/outcome-card";
import { PrintButton } from "@/components/log/print-button";
import { StorySteps } from "@/components/log/story-steps";
import { BackTo } from "@/components/shell/back-to";
import { Card } from "@/components/ui/card";
import { LinkButton } from "@/components/ui/link-button";
import { PageHead } from "@/components/ui/page-head";
import { readStory } from "@/lib/server/diagnoses/story";
import { getLogEntry } from "@/lib/server/log/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../known-id";

type Props = PageProps<"/f/[fleetId]/log/[diagnosisId]">;

const read = cache((fleetId: string, diagnosisId: string) =>
  pageScope("diagnosis:read", fleetId, async (scope) => ({
    story: await readStory(scope, knownId(diagnosisId)),
    entry: await getLogEntry(scope, diagnosisId),
  })),
);

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { fleetId, diagnosisId } = await params;
  const { diagnosis } = (await read(fleetId, diagnosisId)).story;
  return { title: `Diagnosis of ${diagnosis.boatName}, ${diagnosis.engineName}` };
}

export default async function StoryPage({ params }: Props) {
  const { fleetId, diagnosisId } = await params;
  const { story, entry } = await read(fleetId, diagnosisId);
  const { diagnosis, complaint, steps, treeNumber } = story;
  const isOpen = entry.outcome === null;
  return (
    <>
      <PageHead
        title={diagnosis.symptoms.map(({ title }) => title).join(", ") || "A diagnosis without a symptom"}
        under={
          <>
            <Link className="link" prefetch={false} href={`/f/${fleetId}/engines/${diagnosis.engineId}`}>
              {diagnosis.boatName}, {diagnosis.engineName}
            </Link>
            . Begun <Moment at={diagnosis.begunAt} /> by {diagnosis.begunBy}
            {diagnosis.endedAt && (
              <>
                , ended <Moment at={diagnosis.endedAt} />
              </>
            )}
            . With{" "}
            <Link className="link" prefetch={false} href={`/f/${fleetId}/trees/${diagnosis.treeVersionId}`}>
              version {treeNumber} of the fault tree
            </Link>
            .
          </>
        }
        back={<BackTo href={`/f/${fleetId}/log`} title="Logged diagnoses" />}
        action={
          <div className="flex flex-wrap gap-3">
            <PrintButton />
            {isOpen && (
              <LinkButton tone="strong" prefetch={false} href={`/diagnose?fleet=${fleetId}&d=${diagnosis.id}`}>
                Go on with it
              </LinkButton>
            )}
          </div>
        }
      />
      <div className="grid grid-cols-1 gap-5">
        {complaint && (
          <Card aria-labelledby="said">
            <h2 id="said">What was said</h2>
            <p className="mt-1">“{complaint}”</p>
          </Card>
        )}
        {!isOpen && <OutcomeCard entry={entry} />}
        <section aria-labelledby="steps">
          <h2 id="steps" className="mb-3">
            Step by step
          </h2>
          <StorySteps fleetId={fleetId} steps={steps} />
          {isOpen && <p className="mt-5 text-ink-2">It has not ended yet.</p>}
        </section>
      </div>
    </>
  );
}
