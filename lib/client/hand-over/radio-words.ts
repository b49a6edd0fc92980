import { SITUATIONS, type HandOverFacts } from "./facts";
import { positionSpoken } from "./position";

/** What to read out over the radio, a breath a line. The caller fills in the station called and the people aboard. */
export function radioWords(facts: HandOverFacts): string[] {
  return [
    `This is ${facts.boat}, ${facts.boat}, ${facts.boat}.`,
    facts.position
      ? `My position is ${positionSpoken(facts.position)}.`
      : "My position is: give latitude and longitude, or bearing and distance from a charted place.",
    `I am ${SITUATIONS[facts.situation]}. My ${facts.engine} has failed: ${(facts.symptoms.join(", and ") || facts.complaint || "engine fault").toLowerCase()}.`,
    ...(facts.checked.length + facts.tried.length > 0
      ? [`We have looked at ${facts.checked.length} things and tried ${facts.tried.length} repairs.`]
      : []),
    ...(facts.possible[0] ? [`The likeliest cause is: ${facts.possible[0].title.toLowerCase()}.`] : []),
    "I need: say a tow, an engineer, or advice.",
    "On board are: say how many people, and that all are well, or who is not.",
    "Over.",
  ];
}
