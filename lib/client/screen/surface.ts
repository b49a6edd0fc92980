import { Me } from "@/lib/core/contract/me";
import { Exchange } from "../exchange/exchange";
import { NoAnswer, request } from "../exchange/request";
import { Observable } from "../observable";
import { deviceId, lastPerson, rememberPerson, saysWhoElse, type LastPerson } from "../person";
import { PhoneStore } from "../store/phone-store";

/** The store that is open, and the exchange that serves it. */
export type Ready = { kind: "ready"; person: LastPerson; store: PhoneStore; exchange: Exchange };
export type SurfaceState = { kind: "opening" | "sign-in" | "no-signal" | "no-fleet" } | Ready;

/**
 * Opens the store of whoever used this phone last, at once and without a network;
 * then asks the server who it is now. Another person, or another fleet, gets another store.
 */
export class Surface {
  readonly state = new Observable<SurfaceState>({ kind: "opening" });
  #stopExchange: (() => void) | null = null;
  #fleetWanted: string | null = null;

  start(fleetWanted: string | null): () => void {
    this.#fleetWanted = fleetWanted;
    const last = lastPerson();
    if (last) this.#open(fleetWanted ? { ...last, fleetId: fleetWanted } : last);
    const ask = () => void this.#askWho();
    ask();
    window.addEventListener("online", ask);
    const elsewhere = (event: StorageEvent) => saysWhoElse(event) && this.#perhapsAnother(ask);
    window.addEventListener("storage", elsewhere);
    return () => {
      window.removeEventListener("online", ask);
      window.removeEventListener("storage", elsewhere);
      this.#stopExchange?.();
      this.#stopExchange = null;
      this.state.set({ kind: "opening" });
    };
  }

  async #askWho(): Promise<void> {
    try {
      const me = Me.parse(await request("/api/v1/me"));
      const current = this.state.get();
      const wish = this.#fleetWanted ?? (current.kind === "ready" ? current.person.fleetId : null);
      const fleet = me.fleets.find(({ id }) => id === wish) ?? me.fleets[0];
      if (!fleet) this.#close("no-fleet");
      else {
        const person = { userId: me.user.id, name: me.user.name, fleetId: fleet.id };
        // Only what the server has said: a link to a fleet that is not this person's must not stand in the way without a signal.
        rememberPerson(person);
        this.#open(person);
      }
    } catch (failure) {
      // Whoever has a store goes on with it; the exchange says what is wrong.
      if (this.state.get().kind === "ready") return;
      this.#close(failure instanceof NoAnswer && failure.status === 401 ? "sign-in" : "no-signal");
    }
  }

  /** Another tab has signed out, or in as someone else: this person's boats go off the screen. */
  #perhapsAnother(ask: () => void): void {
    const current = this.state.get();
    if (current.kind !== "ready" || lastPerson()?.userId === current.person.userId) return;
    this.#close("opening");
    ask();
  }

  #open(person: LastPerson): void {
    const current = this.state.get();
    if (current.kind === "ready" && current.person.userId === person.userId && current.person.fleetId === person.fleetId) return;
    this.#stopExchange?.();
    const store = new PhoneStore(person.userId, person.fleetId, deviceId());
    const exchange = new Exchange(store, person.userId, person.fleetId);
    this.#stopExchange = exchange.start();
    this.state.set({ kind: "ready", person, store, exchange });
  }

  #close(kind: "opening" | "sign-in" | "no-signal" | "no-fleet"): void {
    this.#stopExchange?.();
    this.#stopExchange = null;
    this.state.set({ kind });
  }
}
