import { FindingLink, type FindingLink as Link } from "@/lib/core/tree/finding-link";
import { STRENGTHS } from "@/lib/core/tree/strength";

/** What was typed into a cell: a strength, null for an emptied cell, undefined for what is none. A word may be begun only: "us" is "usually". */
export function readCell(text: string): Link | null | undefined {
  const plain = text.trim().toLowerCase().replace(",", ".").replace("×", "x");
  if (plain === "") return null;
  const words = Object.keys(STRENGTHS).filter((word) => word.startsWith(plain));
  const whole = words.find((word) => word === plain) ?? (words.length === 1 ? words[0] : undefined);
  const parsed = FindingLink.safeParse(whole ?? (plain.startsWith("x") ? plain : Number(plain)));
  return parsed.success ? parsed.data : undefined;
}
