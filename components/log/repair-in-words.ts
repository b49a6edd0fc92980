import type { RepairThen } from "@/lib/core/contract/log";
import { OUTCOME_TITLES } from "./filters";

/** What a repair said, line by line; null where it said nothing. */
export function repairInWords(said: RepairThen): [title: string, says: string | null][] {
  const parts = said.parts.map(({ title, quantity }) => (quantity === 1 ? title : `${quantity} × ${title}`)).join(", ");
  const meter = said.meterShowed === null ? null : `${said.meterShowed} h${said.meterReset ? ", replaced or set back" : ""}`;
  return [
    ["Done on", said.doneAt.slice(0, 10)],
    ["The meter showed", meter],
    ["Reported", said.symptoms.map(({ title }) => title).join(", ") || null],
    ["Found", said.cause?.title ?? null],
    ["Cured by", said.remedy?.title ?? null],
    ["How it stood", said.outcome && OUTCOME_TITLES[said.outcome]],
    ["Proved", said.proof],
    ["Minutes", said.minutes === null ? null : String(Math.round(said.minutes))],
    ["Parts used", parts || null],
    ["Note", said.note],
  ];
}
