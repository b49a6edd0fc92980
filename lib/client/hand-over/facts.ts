import type { Situation } from "@/lib/core/tree/schema";

/** What the person who comes to help needs to know, in plain words. */
export type HandOverFacts = {
  boat: string;
  engine: string;
  /** "33 kW, 4 cylinders, common rail": what is known of the engine. */
  engineIs: readonly string[];
  fleet: string;
  /** Who hands over. */
  by: string;
  /** "1225 h at the last reading", "about 52 h, estimated"; null: unknown. */
  hours: string | null;
  situation: Situation;
  complaint: string | null;
  symptoms: readonly string[];
  /** What was found, what matters most first. */
  checked: readonly { title: string; says: string }[];
  /** What could not be looked at, by title. */
  notSeen: readonly string[];
  tried: readonly { title: string; says: string }[];
  /** Likeliest first, as counts of 100. */
  possible: readonly { title: string; of100: number }[];
  rulesInForce: readonly { title: string; says: string }[];
  /** Notes in the person's words, with what they were written at. */
  notes: readonly { title: string; says: string }[];
  photos: readonly { id: string; title: string }[];
  crankSeconds: number;
  minutes: number;
  position: Position | null;
};

/** Degrees, south and west negative, as the phone gives them. `at`: when it was taken. */
export type Position = { latitude: number; longitude: number; at: string };

export const SITUATIONS: Record<Situation, string> = { alongside: "alongside", "at-anchor": "at anchor", "under-way": "under way" };
