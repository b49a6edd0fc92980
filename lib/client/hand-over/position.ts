import type { Position } from "./facts";

type Part = { degrees: number; minutes: string; side: "N" | "S" | "E" | "W" };

/** A coordinate as degrees and minutes to a hundredth, rounded before it is split, so that 59.999 minutes never reads as 60. */
function part(value: number, sides: readonly ["N", "S"] | readonly ["E", "W"]): Part {
  const hundredths = Math.round(Math.abs(value) * 6000);
  const degrees = Math.floor(hundredths / 6000);
  return { degrees, minutes: ((hundredths % 6000) / 100).toFixed(2).padStart(5, "0"), side: value < 0 ? sides[1] : sides[0] };
}

const split = (position: Position): { latitude: Part; longitude: Part } => ({
  latitude: part(position.latitude, ["N", "S"]),
  longitude: part(position.longitude, ["E", "W"]),
});

/** "50°12.34′ N 005°03.21′ W", as charts write it. */
export function positionInFigures(position: Position): string {
  const { latitude, longitude } = split(position);
  const say = (one: Part, width: number) => `${String(one.degrees).padStart(width, "0")}\u00b0${one.minutes}\u2032 ${one.side}`;
  return `${say(latitude, 2)} ${say(longitude, 3)}`;
}

/** "50 12.34N 005 03.21W": without the signs that a text message cannot carry. */
export function positionForMessage(position: Position): string {
  const { latitude, longitude } = split(position);
  return `${String(latitude.degrees).padStart(2, "0")} ${latitude.minutes}${latitude.side} ${String(longitude.degrees).padStart(3, "0")} ${longitude.minutes}${longitude.side}`;
}

const DIGITS = ["zero", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine"];
const SIDES = { N: "north", S: "south", E: "east", W: "west" } as const;
const spoken = (figures: string): string => [...figures].map((sign) => (sign === "." ? "decimal" : (DIGITS[Number(sign)] ?? ""))).join(" ");

/** Digit by digit, as it is read out over the radio. */
export function positionSpoken(position: Position): string {
  const { latitude, longitude } = split(position);
  const say = (one: Part, width: number) =>
    `${spoken(String(one.degrees).padStart(width, "0"))} degrees, ${spoken(one.minutes)} minutes ${SIDES[one.side]}`;
  return `${say(latitude, 2)}; ${say(longitude, 3)}`;
}
