import "server-only";
import { setImmediate } from "node:timers/promises";
import { and, eq } from "drizzle-orm";
import { diagnoses } from "@/db/schema/diagnoses";
import type { Story, StoryStep } from "@/lib/core/contract/diagnosis";
import type { DiagnosisEvent, StoredEvent } from "@/lib/core/contract/event";
import { Problem } from "@/lib/core/contract/problem";
import { fold } from "@/lib/core/diagnosis/fold";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { view } from "@/lib/core/diagnosis/show";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { FleetScope } from "@/lib/server/auth/scope";
import { pinnedVersion } from "@/lib/server/trees/pinned-version";
import { getTreeVersion } from "@/lib/server/trees/queries";
import { getDiagnosis } from "./queries";
import { plainEvents, readEvents } from "./stored-events";

const CAUSES_TOLD = 5;

/** A diagnosis for someone who was not there: step by step what was said, why it was asked, and what was believed then. Worked out anew from the log and the pinned tree. */
export async function readStory(scope: FleetScope, id: string): Promise<Story> {
  const [row] = await scope.tx
    .select()
    .from(diagnoses)
    .where(and(eq(diagnoses.fleetId, scope.fleetId), eq(diagnoses.id, id)));
  if (!row) throw Problem.notFound();
  const version = await getTreeVersion(scope, pinnedVersion(row).id);
  const stored = await readEvents(scope, id);
  return {
    diagnosis: await getDiagnosis(scope, id),
    complaint: stored.flatMap((event) => (event.kind === "begun" ? [event.payload.complaint ?? null] : []))[0] ?? null,
    steps: await stepsOf(version.document, stored),
    treeNumber: version.number,
  };
}

/** Each event in the order in which it could be known, with the view just before and just after it. */
async function stepsOf(tree: FaultTree, stored: readonly StoredEvent[]): Promise<StoryStep[]> {
  const models = keepModels();
  const names = new Map(stored.map((event) => [event.id, event.byName]));
  const events = fold(plainEvents(stored)).order.events;
  let before: DiagnosisView | null = null;
  const steps: StoryStep[] = [];
  for (const [index, event] of events.entries()) {
    // Each view takes some milliseconds: others are served in between.
    await setImmediate();
    const after = view(tree, events.slice(0, index + 1), models);
    steps.push(...stepOf(event, before, after, names.get(event.id) ?? ""));
    before = after;
  }
  return steps;
}

function stepOf(event: DiagnosisEvent, before: DiagnosisView | null, after: DiagnosisView, by: string): StoryStep[] {
  const line = after.said.find((said) => said.event === event.id) ?? changeOf(event, before, after);
  if (!line) return [];
  const { causes, others, unknown } = after.possible;
  const told = causes.slice(0, CAUSES_TOLD);
  const folded = causes.slice(CAUSES_TOLD).reduce((sum, cause) => sum + cause.of100, 0);
  return [
    {
      event: event.id,
      kind: event.kind,
      key: line.key,
      title: line.title,
      says: line.says,
      at: event.madeAt,
      by,
      note: line.note,
      photos: [...line.photos],
      askedWhy: whyAsked(event, before),
      changes: changedBy(event, before),
      believed: told.map(({ key, title, of100 }) => ({ key, title, of100 })),
      others: others.of100 + folded,
      unknown: unknown.of100,
    },
  ];
}

type Line = Pick<StoryStep, "key" | "title" | "says" | "note"> & { photos: readonly string[] };

/** What is not said but done to something said: taking it back, or picking one of two answers. */
function changeOf(event: DiagnosisEvent, before: DiagnosisView | null, after: DiagnosisView): Line | null {
  if (event.kind !== "taken-back" && event.kind !== "picked") return null;
  const meant = [...(before?.said ?? []), ...after.said].find((said) => said.event === event.payload.event);
  const says = meant ? (meant.says ? `${meant.title}: ${meant.says}` : meant.title) : "";
  return {
    key: meant?.key ?? null,
    title: event.kind === "picked" ? "Picked one of two answers" : "Taken back",
    says,
    note: null,
    photos: [],
  };
}

/** An answer given in the place of another. */
function changedBy(event: DiagnosisEvent, before: DiagnosisView | null): StoryStep["changes"] {
  const earlier = before?.said.find((said) => said.event === event.supersedes);
  return earlier ? { event: earlier.event, was: earlier.says } : null;
}

function whyAsked(event: DiagnosisEvent, before: DiagnosisView | null): string | null {
  if (event.kind === "rule-answered") return before?.rulesToAsk.find((rule) => rule.key === event.payload.rule)?.because ?? null;
  const key = event.kind === "answered" ? event.payload.check : event.kind === "remedy-tried" ? event.payload.remedy : null;
  return key !== null && before?.step?.key === key ? before.step.why : null;
}
