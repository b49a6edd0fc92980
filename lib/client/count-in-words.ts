const WORDS = ["none", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten", "eleven", "twelve"];

/** "six"; in figures above twelve. */
export const inWords = (count: number): string => WORDS[count] ?? String(count);
