import { Me } from "@/lib/core/contract/me";
import { Observable } from "../observable";
import type { PhoneStore } from "../store/phone-store";
import { backoffSeconds } from "./backoff";
import { pull } from "./pull";
import { hasNoRoom, push } from "./push";
import { NoAnswer, request } from "./request";
import { NOTHING_YET, type Standing } from "./standing";

const FRESH_MS = 60_000;
/** A store that is full is not emptied by the minute, and a picture costs a weak signal dear. */
const FULL_MS = 60 * 60_000;

/**
 * Moves the outbox ashore and brings what is new, whenever there is a chance of
 * it: at the start, when a signal returns, when the page is looked at again, after
 * each entry, and after a growing pause. The screen never waits for it.
 */
export class Exchange {
  readonly standing = new Observable<Standing>(NOTHING_YET);
  readonly #store: PhoneStore;
  readonly #userId: string;
  readonly #fleetId: string;
  #running = false;
  #again = false;
  #failures = 0;
  #timer: ReturnType<typeof setTimeout> | null = null;
  #pulledAt = 0;
  /** When the server last said that the person of this store is the one signed in. */
  #knownAt = 0;
  /** Until when pictures are not carried to a store that is full. */
  #fullUntil = 0;
  /** Tree versions that this page cannot read. */
  readonly #tooNew = new Set<string>();
  #ended = false;

  constructor(store: PhoneStore, userId: string, fleetId: string) {
    this.#store = store;
    this.#userId = userId;
    this.#fleetId = fleetId;
  }

  /** Starts listening; the function it gives back stops. */
  start(): () => void {
    this.#ended = false;
    const back = () => this.nudge(true);
    const seen = () => document.visibilityState === "visible" && this.nudge(true);
    const stopWatching = this.#store.changes.watch(() => void this.#count());
    window.addEventListener("online", back);
    document.addEventListener("visibilitychange", seen);
    // Another phone may be answering the same diagnosis.
    const round = setInterval(() => document.visibilityState === "visible" && this.nudge(), FRESH_MS);
    this.nudge(true);
    return () => {
      this.#ended = true;
      clearInterval(round);
      stopWatching();
      window.removeEventListener("online", back);
      document.removeEventListener("visibilitychange", seen);
      if (this.#timer) clearTimeout(this.#timer);
    };
  }

  /** Try now. `hopeful`: something has changed, so the pause starts over. */
  nudge(hopeful = false): void {
    if (hopeful) this.#failures = this.#knownAt = 0;
    this.#again = true;
    if (!this.#running) void this.#run();
  }

  /** Someone asks for it: whatever was put off is tried again too. */
  sendNow(): void {
    this.#fullUntil = 0;
    this.nudge(true);
  }

  async #run(): Promise<void> {
    this.#running = true;
    if (this.#timer) clearTimeout(this.#timer);
    while (this.#again && !this.#ended) {
      this.#again = false;
      await this.#count();
      this.#say({ sending: this.standing.get().waiting > 0 });
      try {
        await oneTabAtATime(`gudgeon.exchange.${this.#fleetId}`, () => this.#exchange());
        this.#failures = 0;
        this.#say({ sending: false, trouble: this.#standingTrouble(), ashoreAt: new Date().toISOString() });
      } catch (failure) {
        this.#failures += 1;
        this.#knownAt = 0;
        this.#say({ sending: false, trouble: troubleOf(failure) });
        this.#timer = setTimeout(() => this.nudge(), backoffSeconds(this.#failures, Math.random()) * 1000);
      }
      await this.#count();
    }
    this.#running = false;
  }

  async #exchange(): Promise<void> {
    await this.#samePerson();
    const held = await push(this.#store, this.#fleetId, Date.now() >= this.#fullUntil);
    if (hasNoRoom(held)) this.#fullUntil = Date.now() + FULL_MS;
    if (Date.now() - this.#pulledAt >= FRESH_MS) {
      await pull(this.#store, this.#fleetId, this.#tooNew);
      this.#pulledAt = Date.now();
    }
    if (held && !hasNoRoom(held)) throw held;
  }

  /** What another try in a moment would not mend. */
  #standingTrouble(): Standing["trouble"] {
    if (Date.now() < this.#fullUntil) return "full";
    return this.#tooNew.size > 0 ? "too-new" : null;
  }

  /** Someone else may have signed in on this phone since, in another tab: nothing of this person's goes ashore in their name. */
  async #samePerson(): Promise<void> {
    if (Date.now() - this.#knownAt < FRESH_MS) return;
    const { user } = Me.parse(await request("/api/v1/me"));
    if (user.id !== this.#userId) throw new NoAnswer(401, "another person is signed in on this phone", {});
    this.#knownAt = Date.now();
  }

  async #count(): Promise<void> {
    const [events, photos] = await Promise.all([this.#store.unsentEvents(), this.#store.unsentPhotos()]);
    this.#say({ waiting: events.length + photos.length });
  }

  #say(part: Partial<Standing>): void {
    const now = this.standing.get();
    const next = { ...now, ...part };
    if ((Object.keys(next) as (keyof Standing)[]).some((key) => next[key] !== now[key])) this.standing.set(next);
  }
}

function troubleOf(failure: unknown): Standing["trouble"] {
  if (!(failure instanceof NoAnswer)) {
    // Not the network but an answer, or a store, that is not as agreed: whoever looks into it needs the words.
    console.error(failure);
    return "server";
  }
  if (failure.isNoSignal) return "no-signal";
  if (failure.status === 401) return "sign-in";
  return failure.status === 403 || failure.status === 404 ? "not-in-fleet" : "server";
}

async function oneTabAtATime(name: string, work: () => Promise<void>): Promise<void> {
  if (!("locks" in navigator)) return work();
  await navigator.locks.request(name, work);
}
