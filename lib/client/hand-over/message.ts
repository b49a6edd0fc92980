import { saidTogether } from "../said-together";
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

/** One message gets through on a poor signal where two do not; two at most. */
const ONE_MESSAGE = 160;
const TWO_MESSAGES = 306;

/**
 * The hand-over as a text message. The first things matter most: who, what,
 * where, what must not be done; then as much of the findings as fits into one
 * message, what matters most first, and how many more there are. Where not even
 * the first finding fits, it is two messages. What could not be looked at is left out.
 */
export function handOverMessage(facts: HandOverFacts): string {
  const head = inPlainSigns(
    [
      `${facts.boat}, ${facts.engine}: ${facts.symptoms.join("; ") || facts.complaint || "engine fault"}.`,
      `${capital(SITUATIONS[facts.situation])}${facts.position ? ` ${positionForMessage(facts.position)}` : ""}.`,
      ...facts.rulesInForce.map(({ title }) => `In force: ${title}.`),
    ].join(" "),
  );
  const [likeliest] = facts.possible;
  const more = [
    ...facts.tried.map(({ title, says }) => `Tried ${title}: ${says}.`),
    ...facts.checked.map(({ title, says }) => `${saidTogether(title, says)}.`),
  ];
  // The first finding, then what it points to, then the rest.
  const parts = [...more.slice(0, 1), ...(likeliest ? [`Maybe ${likeliest.title}, ${likeliest.of100} of 100.`] : []), ...more.slice(1)];
  const short = filled(head, parts, ONE_MESSAGE);
  return short.told > 0 || parts.length === 0 ? short.text : filled(head, parts, TWO_MESSAGES).text;
}

/** As many of the parts as fit, in their order, and how many were left out. */
function filled(head: string, parts: readonly string[], most: number): { text: string; told: number } {
  let text = head;
  for (const [at, part] of parts.entries()) {
    const left = parts.length - at - 1;
    const next = `${text} ${inPlainSigns(part)}`;
    if (next.length + (left > 0 ? ` +${left} more.`.length : 0) > most) return { text: `${text} +${left + 1} more.`, told: at };
    text = next;
  }
  return { text, told: parts.length };
}

const inPlainSigns = (text: string): string => [...text].map((sign) => PLAIN[sign] ?? sign).join("");
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
