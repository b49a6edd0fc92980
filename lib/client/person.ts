import { uuidv7 } from "uuidv7";

/** Who used this phone last, and with which fleet: enough to open the right store without a network. */
export type LastPerson = { userId: string; name: string; fleetId: string };

const DEVICE = "gudgeon.device";
const LAST = "gudgeon.last";

let deviceOfThisPage: string | null = null;

/** This browser's own id: the same until its storage is cleared, and for the life of the page where nothing can be kept. */
export function deviceId(): string {
  if (deviceOfThisPage) return deviceOfThisPage;
  let id: string | null = null;
  try {
    id = localStorage.getItem(DEVICE);
    if (!id) {
      id = uuidv7();
      localStorage.setItem(DEVICE, id);
    }
  } catch {
    id ??= uuidv7();
  }
  deviceOfThisPage = id;
  return id;
}

export function lastPerson(): LastPerson | null {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(LAST) ?? "null");
    return isLastPerson(kept) ? kept : null;
  } catch {
    return null;
  }
}

export function rememberPerson(person: LastPerson): void {
  try {
    localStorage.setItem(LAST, JSON.stringify(person));
  } catch {
    // Without it the phone asks the server at the next start; nothing is lost.
  }
}

/** Has another tab remembered someone else, or forgotten? A null key: all that was kept was cleared. */
export const saysWhoElse = (event: StorageEvent): boolean => event.key === LAST || event.key === null;

/** On signing out: the next person must not be shown this one's boats. What has not been sent stays in this person's store. */
export function forgetPerson(): void {
  try {
    localStorage.removeItem(LAST);
  } catch {
    // Nothing was kept.
  }
}

function isLastPerson(kept: unknown): kept is LastPerson {
  if (typeof kept !== "object" || kept === null) return false;
  const { userId, name, fleetId } = kept as Record<string, unknown>;
  return typeof userId === "string" && typeof name === "string" && typeof fleetId === "string";
}
