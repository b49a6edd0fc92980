import "fake-indexeddb/auto";
import { IDBFactory, IDBObjectStore } from "fake-indexeddb";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { Database } from "@/lib/client/store/database";
import { PhoneStore } from "@/lib/client/store/phone-store";
import { idOf } from "./make-event";

const DIAGNOSIS = idOf(9001);
const DEVICE = idOf(8001);
const open = (user = 1, fleet = 1) => new PhoneStore(idOf(7000 + user), idOf(6000 + fleet), DEVICE);
const note = (store: PhoneStore, says: string) => store.record(DIAGNOSIS, "noted", { note: says, photos: [] });
const said = async (store: PhoneStore) =>
  (await store.events(DIAGNOSIS)).map(({ event }) => [event.sequence, event.kind === "noted" ? event.payload.note : event.kind]);

/** A disk that is full: every write fails, every read goes on. */
function fullDisk() {
  const full = () => {
    throw new DOMException("full", "QuotaExceededError");
  };
  const spies = [vi.spyOn(IDBObjectStore.prototype, "add"), vi.spyOn(IDBObjectStore.prototype, "put")];
  for (const spy of spies) spy.mockImplementation(full);
  return () => spies.forEach((spy) => spy.mockRestore());
}

beforeEach(() => {
  indexedDB = new IDBFactory();
});
afterEach(() => {
  vi.restoreAllMocks();
});

describe("what is tapped", () => {
  it("is there again after the page was killed, in its order and waiting to be sent", async () => {
    const store = open();
    await note(store, "first");
    await note(store, "second");
    const again = open();
    expect(await said(again)).toEqual([
      [1, "first"],
      [2, "second"],
    ]);
    expect(await again.unsentEvents()).toHaveLength(2);
  });

  it("gets a number of its own in each of two tabs", async () => {
    const [one, two] = [open(), open()];
    await Promise.all([note(one, "a"), note(two, "b"), note(one, "c"), note(two, "d")]);
    expect((await said(open())).map(([sequence]) => sequence).sort()).toEqual([1, 2, 3, 4]);
  });

  it("is shown and said to be unsaved while the disk is full, and written with the next answer", async () => {
    const store = open();
    const room = fullDisk();
    await note(store, "no room");
    expect(store.unsaved.get()).toBe(true);
    expect(await said(store)).toEqual([[1, "no room"]]);
    room();
    await note(store, "room again");
    expect(store.unsaved.get()).toBe(false);
    expect(await said(open())).toEqual([
      [1, "no room"],
      [2, "room again"],
    ]);
  });

  it("keeps its number when it is sent before it could be written: the next answer takes the next one", async () => {
    const store = open();
    const room = fullDisk();
    const first = await note(store, "only in memory");
    await store.settle([{ id: first.id }]);
    expect(await store.unsentEvents()).toEqual([]);
    expect(await said(store)).toEqual([[1, "only in memory"]]);
    room();
    expect((await note(store, "next")).sequence).toBe(2);
    expect(await said(open())).toEqual([
      [1, "only in memory"],
      [2, "next"],
    ]);
    expect((await open().unsentEvents()).map(({ event }) => event.sequence)).toEqual([2]);
  });

  it("is written once where the handle died after the write and before its word", async () => {
    const store = open();
    const run = Database.prototype.run;
    vi.spyOn(Database.prototype, "run").mockImplementationOnce(async function (this: Database, work) {
      await run.call(this, work);
      return run.call(this, work) as never;
    });
    await note(store, "once");
    expect((await said(open())).filter(([, says]) => says === "once")).toHaveLength(1);
  });
});

describe("pictures", () => {
  it("are refused with words when there is no room, and never named by an answer as if they were there", async () => {
    const store = open();
    fullDisk();
    await expect(store.addPhoto(new Blob(["x"], { type: "image/jpeg" }))).rejects.toThrow(/could not be kept/);
  });

  it("stay after they are sent, and after they are refused, with the reason", async () => {
    const store = open();
    const [sent, refused] = [await store.addPhoto(new Blob(["a"])), await store.addPhoto(new Blob(["b"]))];
    await store.settlePhoto(sent);
    await store.settlePhoto(refused, "too large");
    expect(await store.unsentPhotos()).toEqual([]);
    expect(await store.photo(sent)).not.toHaveProperty("rejected");
    expect(await store.photo(refused)).toMatchObject({ rejected: "too large" });
  });
});

describe("another person on the same phone", () => {
  it("sees nothing of the first, nor does another fleet of the same person", async () => {
    const first = open(1);
    await note(first, "mine");
    await first.addPhoto(new Blob(["mine"]));
    for (const other of [open(2), open(1, 2)]) {
      expect(await other.summaries()).toEqual([]);
      expect(await other.unsentEvents()).toEqual([]);
      expect(await other.unsentPhotos()).toEqual([]);
    }
    expect(await open(1).unsentEvents()).toHaveLength(1);
  });
});

describe("events from the server", () => {
  it("are taken in once, and do not take what waits here for sent", async () => {
    const store = open();
    const mine = await note(store, "mine");
    const theirs = { ...mine, id: idOf(5), device: idOf(8002) };
    await store.takeIn([mine, theirs]);
    await store.takeIn([theirs]);
    expect(await store.events(DIAGNOSIS)).toHaveLength(2);
    expect((await store.unsentEvents()).map(({ event }) => event.id)).toEqual([mine.id]);
  });
});
