import "fake-indexeddb/auto";
import { IDBFactory } from "fake-indexeddb";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { Exchange } from "@/lib/client/exchange/exchange";
import { pull } from "@/lib/client/exchange/pull";
import { push } from "@/lib/client/exchange/push";
import { NoAnswer } from "@/lib/client/exchange/request";
import { standingInShort, standingInWords } from "@/lib/client/exchange/standing";
import { PhoneStore } from "@/lib/client/store/phone-store";
import { smallTree } from "@/tests/support/small-tree";
import { BEGUN, idOf } from "./make-event";

const FLEET = idOf(6001);
const PERSON = idOf(7001);
const [ONE, TWO] = [idOf(9001), idOf(9002)];
let store: PhoneStore;

type Answer = { status: number; body: unknown; html?: true };
type Sent = { path: string; method: string; ids: string[] };

/** The server, or what stands in its place: what it says to each request, and what it was sent. */
function serverSays(say: (sent: Sent) => Answer): Sent[] {
  const sent: Sent[] = [];
  vi.stubGlobal("fetch", async (path: string, init: RequestInit) => {
    const events = typeof init.body === "string" ? (JSON.parse(init.body) as { events?: { id: string }[] }).events : undefined;
    const request = { path, method: init.method ?? "GET", ids: (events ?? []).map(({ id }) => id) };
    sent.push(request);
    const { status, body, html } = say(request);
    return html
      ? new Response(String(body), { status, headers: { "content-type": "text/html" } })
      : new Response(JSON.stringify(body), { status, headers: { "content-type": "application/json" } });
  });
  return sent;
}

const moment = "2026-06-01T08:00:00Z";
const boat = { id: idOf(11), name: "Tern", callMinutes: {}, version: 1, createdAt: moment };
const fresh = (more: object) => ({
  fleet: { id: FLEET, name: "F" },
  roles: ["skipper"],
  boats: [boat],
  engines: [],
  openDiagnoses: [],
  recentLog: [],
  treeVersion: { id: idOf(2), hash: "h", number: 1, publishedAt: moment },
  multipliers: {},
  ...more,
});
const stored = ({ ids }: Sent): Answer => ({ status: 200, body: { receipts: ids.map((id) => ({ id, result: "stored" })) } });
const problem = (status: number, detail = "no"): Answer => ({ status, body: { type: "urn:x", title: "No", status, detail } });
const begin = (diagnosis: string) => store.record(diagnosis, "begun", BEGUN);
const note = (diagnosis: string) => store.record(diagnosis, "noted", { note: "x", photos: [] });
const waiting = async () => (await store.unsentEvents()).map(({ event }) => event.id);
const refused = async (diagnosis: string) => (await store.events(diagnosis)).map(({ rejected }) => rejected);

beforeEach(() => {
  indexedDB = new IDBFactory();
  store = new PhoneStore(PERSON, FLEET, idOf(8001));
});
afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

describe("emptying the outbox", () => {
  it.each([404, 403, 500])(
    "a diagnosis that gets a %i holds up no other, nor the pictures, and is kept for the next try",
    async (status) => {
      await begin(ONE);
      await begin(TWO);
      await store.addPhoto(new Blob(["x"]));
      serverSays((sent) => {
        if (sent.method === "PUT") return { status: 200, body: { id: sent.path.split("/").at(-1) } };
        return sent.path.includes(ONE) ? problem(status) : stored(sent);
      });
      expect(await push(store, FLEET)).toMatchObject({ status });
      expect((await store.unsentEvents()).map(({ event }) => event.diagnosisId)).toEqual([ONE]);
      expect(await store.unsentPhotos()).toEqual([]);
    },
  );

  it.each([0, 401, 429, 503])("with a %i nothing else is tried, and nothing is lost", async (status) => {
    await begin(ONE);
    await begin(TWO);
    const sent = serverSays(() => problem(status));
    if (status === 0) vi.stubGlobal("fetch", () => Promise.reject(new TypeError("failed to fetch")));
    await expect(push(store, FLEET)).rejects.toMatchObject({ status });
    expect(sent.length).toBeLessThanOrEqual(1);
    expect(await waiting()).toHaveLength(2);
  });

  it("one event that is refused goes aside with the reason, and the rest of its batch arrives", async () => {
    await begin(ONE);
    const bad = await note(ONE);
    await note(ONE);
    serverSays((sent) => (sent.ids.includes(bad.id) ? problem(422, "too long") : stored(sent)));
    expect(await push(store, FLEET)).toBeNull();
    expect(await waiting()).toEqual([]);
    expect(await refused(ONE)).toEqual([undefined, "too long", undefined]);
  });

  it("a diagnosis whose beginning was refused is set aside whole, and does not knock for ever", async () => {
    const begun = await begin(ONE);
    await note(ONE);
    await begin(TWO);
    serverSays((sent) => {
      if (sent.path.includes(TWO)) return stored(sent);
      return sent.ids.includes(begun.id) ? problem(409, "No such engine.") : problem(404);
    });
    expect(await push(store, FLEET)).toBeNull();
    expect(await waiting()).toEqual([]);
    expect(await refused(ONE)).toEqual(["No such engine.", "The diagnosis was not taken. No such engine."]);
    expect(await refused(TWO)).toEqual([undefined]);
  });

  it("understands receipts that a newer server says more in", async () => {
    const event = await begin(ONE);
    serverSays(() => ({ status: 200, body: { receipts: [{ id: event.id, result: "stored", place: 7 }], more: true } }));
    expect(await push(store, FLEET)).toBeNull();
    expect(await waiting()).toEqual([]);
  });

  it("a harbour's sign-in page is not the server: neither answers nor pictures count as sent", async () => {
    await store.addPhoto(new Blob(["x"]));
    serverSays(() => ({ status: 200, body: "<html>Welcome aboard our network</html>", html: true }));
    await expect(push(store, FLEET)).rejects.toMatchObject({ status: 0 });
    expect(await store.unsentPhotos()).toHaveLength(1);
    await begin(ONE);
    serverSays(() => ({ status: 403, body: "<html>Sign in</html>", html: true }));
    await expect(push(store, FLEET)).rejects.toBeInstanceOf(NoAnswer);
    expect(await waiting()).toHaveLength(1);
  });

  it("a picture that will never be taken goes aside, one that failed is kept, and neither holds up the next", async () => {
    const photos = [await store.addPhoto(new Blob(["a"])), await store.addPhoto(new Blob(["b"])), await store.addPhoto(new Blob(["c"]))];
    const answers: Answer[] = [problem(415, "not a picture"), problem(500), { status: 200, body: { id: photos[2] } }];
    serverSays(({ path }) => answers[photos.indexOf(path.split("/").at(-1) ?? "")]!);
    expect(await push(store, FLEET)).toMatchObject({ status: 500 });
    expect((await store.unsentPhotos()).map(({ id }) => id)).toEqual([photos[1]]);
  });
});

describe("a store ashore that is full", () => {
  it("takes the answers; pictures wait for an hour or until someone asks, and that is said", async () => {
    vi.stubGlobal("navigator", {});
    await begin(ONE);
    await store.addPhoto(new Blob(["a"]));
    await store.addPhoto(new Blob(["b"]));
    let full = true;
    const sent = serverSays((one) => {
      if (one.path === "/api/v1/me") return { status: 200, body: { user: { id: PERSON, name: "A", email: "a@example.org" }, fleets: [] } };
      if (one.method === "PUT") return full ? problem(507, "no room") : { status: 200, body: { id: one.path.split("/").at(-1) } };
      if (one.path.endsWith("/phone")) return { status: 200, body: fresh({}) };
      if (one.path.includes("/trees/")) return { status: 200, body: { document: smallTree() } };
      return one.method === "GET" ? { status: 200, body: { events: [] } } : stored(one);
    });
    const pictures = () => sent.filter(({ method }) => method === "PUT").length;
    const exchange = new Exchange(store, PERSON, FLEET);
    exchange.nudge(true);
    await vi.waitFor(() => expect(pictures()).toBe(1));
    await vi.waitFor(() => expect(exchange.standing.get().sending).toBe(false));
    expect(await waiting()).toEqual([]);
    await note(ONE);
    exchange.nudge(true);
    await vi.waitFor(async () => expect(await waiting()).toEqual([]));
    expect(pictures()).toBe(1);
    full = false;
    exchange.sendNow();
    await vi.waitFor(async () => expect(await store.unsentPhotos()).toEqual([]));
  });

  it("is told in words, with what becomes of the photos", () => {
    const full = { waiting: 2, sending: false, trouble: "full", ashoreAt: null } as const;
    expect(standingInShort(full, false)).toBe("Photos kept here");
    expect(standingInWords(full, false)).toContain("no room left there for photos");
  });
});

describe("another person signed in on this phone", () => {
  it("sends nothing of the first person's, and it stays here", async () => {
    vi.stubGlobal("navigator", {});
    await begin(ONE);
    const sent = serverSays(() => ({ status: 200, body: { user: { id: idOf(7002), name: "B", email: "b@example.org" }, fleets: [] } }));
    const exchange = new Exchange(store, PERSON, FLEET);
    exchange.nudge(true);
    await vi.waitFor(() => expect(exchange.standing.get().trouble).toBe("sign-in"));
    expect(sent.map(({ path }) => path)).toEqual(["/api/v1/me"]);
    expect(await waiting()).toHaveLength(1);
  });
});

describe("reading the fleet with an older phone's shapes", () => {
  const pulled = async (answer: unknown) => {
    serverSays(({ path }) =>
      path.endsWith("/phone") ? { status: 200, body: answer } : { status: 200, body: { document: { causes: [] } } },
    );
    await pull(store, FLEET);
    return (await store.phone())?.phone;
  };

  it("leaves out what it does not know of a boat, and keeps the boat", async () => {
    expect((await pulled(fresh({ boats: [{ ...boat, berth: "A4", mooring: { buoy: 3 } }], weather: [] })))?.boats).toEqual([boat]);
  });

  it("leaves out an event of a kind invented since, and takes in the others", async () => {
    const known = await begin(ONE);
    indexedDB = new IDBFactory();
    store = new PhoneStore(PERSON, FLEET, idOf(8003));
    const events = [
      known,
      { ...known, id: idOf(77), sequence: 2, kind: "smelt", payload: {} },
      { ...known, id: idOf(78), sequence: 3, colour: "red" },
    ];
    await pulled(fresh({ openDiagnoses: [{ id: ONE, engineId: BEGUN.engineId, treeVersionId: BEGUN.treeVersionId, events }] }));
    expect(new Set((await store.events(ONE)).map(({ event }) => event.id))).toEqual(new Set([known.id, idOf(78)]));
  });

  it("does not pretend to have read what is missing at its root", async () => {
    await expect(pulled(fresh({ treeVersion: undefined }))).rejects.toThrow();
    expect(await store.phone()).toBeUndefined();
  });

  it("goes on with the tree it has where the fleet's is too new to read, and asks for that one once", async () => {
    const newer = { ...fresh({}), treeVersion: { id: idOf(3), hash: "h3", number: 2, publishedAt: moment } };
    let phone: unknown = fresh({});
    const sent = serverSays(({ path }) => {
      if (path.endsWith("/phone")) return { status: 200, body: phone };
      return { status: 200, body: { document: path.endsWith(idOf(2)) ? smallTree() : { ...smallTree(), format: 2 } } };
    });
    const tooNew = new Set<string>();
    await pull(store, FLEET, tooNew);
    phone = newer;
    for (let again = 0; again < 3; again++) await pull(store, FLEET, tooNew);
    expect(tooNew).toEqual(new Set([idOf(3)]));
    expect((await store.phone())?.phone.treeVersion.id).toBe(idOf(2));
    expect(await store.tree(idOf(2))).toEqual(smallTree());
    expect(await store.tree(idOf(3))).toBeUndefined();
    expect(sent.filter(({ path }) => path.endsWith(idOf(3)))).toHaveLength(1);
  });

  it("keeps no tree of which it cannot read every part", async () => {
    const [rule, ...rules] = smallTree().stopRules;
    const odd = { ...smallTree(), stopRules: [{ ...rule, sounds: "a horn" }, ...rules] };
    serverSays(({ path }) => (path.endsWith("/phone") ? { status: 200, body: fresh({}) } : { status: 200, body: { document: odd } }));
    await pull(store, FLEET);
    expect(await store.tree(idOf(2))).toBeUndefined();
  });
});
