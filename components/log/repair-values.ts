import * as z from "zod";
import { dayOf, isAhead, momentOf } from "@/components/form/day-typed";
import { asTyped, typedNumber } from "@/components/form/typed-number";
import type { NewRepair, Repair, RepairChange } from "@/lib/core/contract/log";

const Said = z.object({ key: z.string(), words: z.string().trim().max(500) });
const isSaid = ({ key, words }: { key: string; words: string }) => key !== "" || words !== "";

/** A repair as its form holds it. */
export const RepairValues = z
  .object({
    day: z
      .string()
      .min(1, "Say which day.")
      .refine((day) => !isAhead(day), "That day is still to come."),
    hours: typedNumber({ from: 0, to: 200_000 }),
    meterReset: z.boolean(),
    symptom: z.string(),
    cause: Said.refine(isSaid, "Say what was wrong, as well as you know it."),
    remedy: Said.refine(isSaid, "Say what was done."),
    outcome: z.enum(["cured", "held"]),
    proof: z.string().trim().max(500),
    minutes: typedNumber({ from: 0, to: 100_000 }),
    parts: z.array(
      z.object({
        key: z.string(),
        title: z.string().trim().max(200),
        quantity: typedNumber({ from: 0.01, to: 1000 }),
      }),
    ),
    note: z.string().max(4000, "Keep it under 4000 characters."),
  })
  .refine(({ outcome, proof }) => outcome === "held" || proof !== "", {
    path: ["proof"],
    message: "Say how it was proved. If it has not been, log it as held for now.",
  });
export type RepairValues = z.input<typeof RepairValues>;
export type RepairGiven = z.output<typeof RepairValues>;

export const NO_REPAIR: RepairValues = {
  day: "",
  hours: "",
  meterReset: false,
  symptom: "",
  cause: { key: "", words: "" },
  remedy: { key: "", words: "" },
  outcome: "held",
  proof: "",
  minutes: "",
  parts: [],
  note: "",
};

/** As the server takes it: what was not said is left out. */
export const newRepair = (id: string, engineId: string, given: RepairGiven): NewRepair => ({ id, engineId, ...repairSaid(given) });

function repairSaid(given: RepairGiven): RepairChange {
  const { cause, remedy, proof, note, hours, minutes, symptom, parts } = given;
  return {
    doneAt: momentOf(given.day),
    outcome: given.outcome,
    symptoms: symptom ? [symptom] : [],
    ...(cause.key ? { cause: cause.key } : { causeInWords: cause.words }),
    ...(remedy.key ? { remedy: remedy.key } : { remedyInWords: remedy.words }),
    ...(proof ? { proof } : {}),
    ...(hours === null ? {} : { engineHours: hours }),
    ...(given.meterReset && hours !== null ? { meterReset: true as const } : {}),
    ...(minutes === null ? {} : { minutes }),
    parts: parts
      .filter((part) => part.title !== "")
      .map((part) => ({ ...(part.key ? { key: part.key } : {}), title: part.title, quantity: part.quantity ?? 1 })),
    ...(note.trim() ? { note } : {}),
  };
}

/** A repair that stands in the log, as its form holds it. */
export function valuesOf({ entry, meterShowed, meterReset }: Repair): RepairValues {
  const said = (thing: { key: string | null; title: string } | null) => ({
    key: thing?.key ?? "",
    words: thing?.key ? "" : (thing?.title ?? ""),
  });
  return {
    day: dayOf(entry.at),
    hours: asTyped(meterShowed),
    meterReset,
    symptom: entry.symptoms[0]?.key ?? "",
    cause: said(entry.cause),
    remedy: said(entry.remedy),
    outcome: entry.outcome === "cured" ? "cured" : "held",
    proof: entry.proof ?? "",
    minutes: asTyped(entry.minutes),
    parts: entry.parts.map(({ key, title, quantity }) => ({ key: key ?? "", title, quantity: asTyped(quantity) })),
    note: entry.note ?? "",
  };
}

/** A repair as it should have been written. A day that was left as it was keeps its hour, and further symptoms stay. */
export function repairChange(was: Repair, given: RepairGiven): RepairChange {
  const change = repairSaid(given);
  const more = was.entry.symptoms.slice(1).map(({ key }) => key);
  return {
    ...change,
    doneAt: given.day === dayOf(was.entry.at) ? was.entry.at : change.doneAt,
    symptoms: [...new Set([...change.symptoms, ...more])],
  };
}
