import { SITUATIONS, type HandOverFacts } from "./facts";
import { positionForMessage } from "./position";

/** Signs of the text message alphabet (GSM 03.38), without which a message holds 70 characters in place of 160. */
const BASIC = /^[@£$¥èéùìòÇ\nØø\rÅåΔ_ΦΓΛΩΠΨΣΘΞÆæßÉ !"#¤%&'()*+,\-./0-9:;<=>?¡A-ZÄÖÑÜ§¿a-zäöñüà]*$/;
const PLAIN: Readonly<Record<string, string>> = {
  "\u2019": "'",
  "\u2018": "'",
  "\u201c": '"',
  "\u201d": '"',
  "\u2013": "-",
  "\u2014": "-",
  "\u2212": "-",
  "\u00b0": " deg",
  "\u2032": "'",
  "\u00d7": "x",
  "\u00b7": ",",
  "\u2026": "...",
  "[": "(",
  "]": ")",
};

/** How a text message is cut and paid for: 160 characters, or 153 each when joined; 70 and 67 with other signs. */
export function messageLength(text: string): { characters: number; messages: number } {
  const basic = BASIC.test(text);
  const [alone, joined] = basic ? [160, 153] : [70, 67];
  const characters = text.length;
  return { characters, messages: characters <= alone ? 1 : Math.ceil(characters / joined) };
}

/** Two joined messages: what gets through on a poor signal. */
const MOST_CHARACTERS = 306;

/**
 * The hand-over as a text message. The first things matter most: who, what,
 * where, what must not be done; then as much of the findings as fits, the
 * latest first, and how many more there are.
 */
export function handOverMessage(facts: HandOverFacts): string {
  const head = [
    `${facts.boat}, ${facts.engine}: ${facts.symptoms.join("; ") || facts.complaint || "engine fault"}.`,
    `${capital(SITUATIONS[facts.situation])}${facts.position ? ` ${positionForMessage(facts.position)}` : ""}.`,
    ...facts.rulesInForce.map((rule) => `${rule}.`),
    ...(facts.possible[0]
      ? [
          `Likeliest: ${facts.possible
            .slice(0, 2)
            .map(({ title, of100 }) => `${title} ${of100}/100`)
            .join(", ")}.`,
        ]
      : []),
  ];
  const findings = [
    ...facts.tried.map(({ title, says }) => `Tried ${title}: ${says}.`),
    ...[...facts.checked].reverse().map(({ title, says }) => `${title}: ${says}.`),
  ];
  let text = inPlainSigns(head.join(" "));
  for (const [index, finding] of findings.entries()) {
    const left = findings.length - index - 1;
    const next = `${text} ${inPlainSigns(finding)}`;
    if (next.length + (left > 0 ? ` +${left} more.`.length : 0) > MOST_CHARACTERS) return `${text} +${left + 1} more.`;
    text = next;
  }
  return text;
}

const inPlainSigns = (text: string): string => [...text].map((sign) => PLAIN[sign] ?? sign).join("");
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
