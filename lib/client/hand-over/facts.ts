import type { Situation } from "@/lib/core/tree/schema";

/** What the person who comes to help needs to know, in plain words. */
export type HandOverFacts = {
  boat: string;
  engine: string;
  /** "33 kW, 4 cylinders, common rail": what is known of the engine. */
  engineIs: readonly string[];
  /** Hours of the meter at the last reading; null: unknown. */
  hours: number | null;
  situation: Situation;
  complaint: string | null;
  symptoms: readonly string[];
  checked: readonly { title: string; says: string }[];
  tried: readonly { title: string; says: string }[];
  /** Likeliest first, as counts of 100. */
  possible: readonly { title: string; of100: number }[];
  rulesInForce: readonly string[];
  crankSeconds: number;
  minutes: number;
  position: Position | null;
};

/** Degrees, south and west negative, as the phone gives them. `at`: when it was taken. */
export type Position = { latitude: number; longitude: number; at: string };

export const SITUATIONS: Record<Situation, string> = { alongside: "alongside", "at-anchor": "at anchor", "under-way": "under way" };
