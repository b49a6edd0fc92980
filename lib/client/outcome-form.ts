import type { OutcomeKind, OutcomePayload } from "@/lib/core/contract/event";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { FaultTree } from "@/lib/core/tree/schema";
import { readNumber } from "@/lib/core/units/read-number";

/** "": not said. "own-words": not in the tree. */
export const OWN_WORDS = "own-words";

export type PartUsed = { key: string | null; title: string; quantity: number };

/** What is typed on the outcome screen, as typed. */
export type OutcomeForm = {
  outcome: OutcomeKind;
  cause: string;
  causeInWords: string;
  remedy: string;
  remedyInWords: string;
  proof: string;
  hours: string;
  meterReset: boolean;
  minutes: string;
  parts: readonly PartUsed[];
  note: string;
};

export function partsOf(tree: FaultTree, remedy: string): PartUsed[] {
  return (tree.remedies.find(({ key }) => key === remedy)?.parts ?? []).map(({ key, title, quantity }) => ({ key, title, quantity }));
}

/** The form as the diagnosis leaves it: what was cured is filled in, and nothing is claimed that was not said. */
export function startingForm(view: DiagnosisView, tree: FaultTree, minutes: number): OutcomeForm {
  const { curedCause, runsAgain } = view;
  const outcome: OutcomeKind = curedCause
    ? curedCause.temporary || curedCause.proof === null
      ? "held"
      : "cured"
    : runsAgain
      ? "by-itself"
      : "broken-off";
  return {
    outcome,
    cause: curedCause?.cause ?? "",
    causeInWords: "",
    remedy: curedCause?.remedy ?? "",
    remedyInWords: "",
    proof: curedCause?.proof ?? "",
    hours: "",
    meterReset: false,
    minutes: String(Math.round(minutes)),
    parts: curedCause ? partsOf(tree, curedCause.remedy) : [],
    note: "",
  };
}

/** What of the form hangs on what cured it, and is filled in afresh when that is another thing. */
export const FOLLOWS_THE_CURE = ["outcome", "cause", "remedy", "proof", "parts"] as const;

/** What the form is filled in from. */
export const basisOf = ({ curedCause, runsAgain }: Pick<DiagnosisView, "curedCause" | "runsAgain">): string =>
  curedCause ? `${curedCause.remedy} ${curedCause.proof ?? ""}` : runsAgain ? "runs again" : "";

export type FormErrors = Partial<Record<"hours" | "minutes" | "proof" | "cause", string>>;

/** The outcome as it is logged, or what has to be put right first. `lastHours`: the last reading of the meter; null: unknown. */
export function outcomeOf(form: OutcomeForm, lastHours: number | null): { outcome: OutcomePayload } | { errors: FormErrors } {
  const errors: FormErrors = {};
  const hours = form.hours.trim() === "" ? undefined : readNumber(form.hours);
  const minutes = form.minutes.trim() === "" ? undefined : readNumber(form.minutes);
  if (hours === null || (hours !== undefined && (hours < 0 || hours > 200_000))) errors.hours = "Hours are a figure between 0 and 200 000.";
  else if (hours !== undefined && lastHours !== null && hours < lastHours && !form.meterReset)
    errors.hours = `That is less than the ${lastHours} h read last. Read it again, or say that the meter was replaced.`;
  if (minutes === null || (minutes !== undefined && (minutes < 0 || minutes > 100_000)))
    errors.minutes = "Minutes are a figure between 0 and 100 000.";
  if (form.outcome === "cured" && form.proof.trim() === "")
    errors.proof = "Say how it was proved. If it has not been, log it as held for now.";
  const unnamed = form.cause === "" || (form.cause === OWN_WORDS && form.causeInWords.trim() === "");
  if (form.outcome === "cured" && unnamed) errors.cause = "Say what it was, in your own words if the tree does not have it.";
  if (Object.keys(errors).length > 0) return { errors };
  const named = form.outcome === "cured" || form.outcome === "held" || form.cause !== "";
  const own = (text: string) => (text.trim() ? text.trim() : undefined);
  return {
    outcome: drop<OutcomePayload>({
      outcome: form.outcome,
      cause: named && form.cause && form.cause !== OWN_WORDS ? form.cause : undefined,
      causeInWords: form.cause === OWN_WORDS ? own(form.causeInWords) : undefined,
      remedy: form.remedy && form.remedy !== OWN_WORDS ? form.remedy : undefined,
      remedyInWords: form.remedy === OWN_WORDS ? own(form.remedyInWords) : undefined,
      proof: own(form.proof),
      engineHours: hours ?? undefined,
      meterReset: form.meterReset && hours !== undefined ? (true as const) : undefined,
      minutes: minutes ?? undefined,
      parts: form.parts
        .filter(({ quantity, title }) => quantity > 0 && title.trim() !== "")
        .map(({ key, title, quantity }) => drop<OutcomePayload["parts"][number]>({ key: key ?? undefined, title: title.trim(), quantity })),
      note: own(form.note),
    }),
  };
}

/** An absent key is "not said"; one that holds undefined would be kept on the phone as something else. */
function drop<T extends object>(from: T): T {
  return Object.fromEntries(Object.entries(from).filter(([, value]) => value !== undefined)) as T;
}
