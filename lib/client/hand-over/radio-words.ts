import { SITUATIONS, type HandOverFacts } from "./facts";
import { positionSpoken } from "./position";

/** More than this nobody writes down at the other end. */
const SPOKEN_FINDINGS = 3;
/** Of 100: from here on it is likelier than all the rest together. */
const LIKELY = 50;

/** What to read out over the radio, a breath a line. The caller fills in the station called and the people aboard. */
export function radioWords(facts: HandOverFacts): string[] {
  const [likeliest] = facts.possible;
  return [
    `This is ${facts.boat}, ${facts.boat}, ${facts.boat}.`,
    facts.position
      ? `My position is ${positionSpoken(facts.position)}.`
      : "My position is: give latitude and longitude, or bearing and distance from a charted place.",
    ...facts.rulesInForce.map(({ title }) => `Danger on board: ${lower(title)}.`),
    `I am ${SITUATIONS[facts.situation]}. My ${/engine|motor/i.test(facts.engine) ? facts.engine : `${facts.engine} engine`} is in trouble: ${(facts.symptoms.join(", and ") || facts.complaint || "engine fault").toLowerCase()}.`,
    ...(facts.checked.length > 0
      ? [
          `We found: ${facts.checked
            .slice(0, SPOKEN_FINDINGS)
            .map(({ title, says }) => `${lower(title)}, ${lower(says)}`)
            .join("; ")}.`,
        ]
      : []),
    ...(facts.tried.length > 0 ? [`We tried: ${facts.tried.map(({ title, says }) => `${lower(title)}, ${lower(says)}`).join("; ")}.`] : []),
    ...(likeliest ? [`${likeliest.of100 >= LIKELY ? "It is most likely" : "It may be"}: ${lower(likeliest.title)}.`] : []),
    "I need: say a tow, an engineer, or advice.",
    "On board are: say how many people, and that all are well, or who is not.",
    "Over.",
  ];
}

const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
