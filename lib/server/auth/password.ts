import "server-only";
import { hash, verify } from "@node-rs/argon2";
import { Problem } from "@/lib/core/contract/problem";

// argon2id (the library's default) with 19 MiB and two passes: OWASP Password Storage Cheat Sheet.
const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

const SLOTS = 2;
const MAX_WAITING = 100;
let busy = 0;
const waiting: (() => void)[] = [];

/** Two hashes at once and no more: a crowd at the door must not take the machine's memory and both its cores. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (busy >= SLOTS) {
    if (waiting.length >= MAX_WAITING) throw new Problem(503, "unavailable", "The server is busy", "Try again in a moment.");
    // Whoever ends hands its slot on.
    await new Promise<void>((resolve) => waiting.push(resolve));
  } else busy++;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else busy--;
  }
}

export const hashPassword = (password: string): Promise<string> => inTurn(() => hash(password.normalize("NFKC"), OPTIONS));

export const verifyPassword = (stored: string, password: string): Promise<boolean> =>
  inTurn(() => verify(stored, password.normalize("NFKC")));

/** Was it made with other costs than today's? */
export const isOutdated = (stored: string): boolean =>
  !stored.startsWith("$argon2id$") || !stored.includes(`m=${OPTIONS.memoryCost},t=${OPTIONS.timeCost},p=${OPTIONS.parallelism}$`);

let unknown: Promise<string> | undefined;

/** For an address nobody has: the same work, so that the time taken tells nothing. */
export async function verifyNobody(password: string): Promise<false> {
  await verifyPassword(await (unknown ??= hashPassword("nobody has this one")), password);
  return false;
}
