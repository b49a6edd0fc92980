/** What a person may be in a fleet; most are all three on their own boat. */
export const ROLES = ["skipper", "mechanic", "owner"] as const;
export type Role = (typeof ROLES)[number];
