import "fake-indexeddb/auto";
import { IDBFactory } from "fake-indexeddb";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { SessionKeeper } from "@/lib/client/workshop/session-keeper";
import { resumeWorkbench, type Workbench } from "@/lib/client/workshop/workbench";
import type { TreeDraft, TreeEdit } from "@/lib/core/contract/draft";
import { applyEdit } from "@/lib/core/tree/edits/apply-edit";
import { putNode } from "@/lib/core/tree/edits/put-node";
import type { FaultTree } from "@/lib/core/tree/schema";
import { smallTree } from "../../support/small-tree";
import { idOf } from "./make-event";

const FLEET = idOf(6001);
const first = smallTree().causes[0]!;
const renamed = (tree: FaultTree, title: string) => putNode(tree, "causes", { ...tree.causes[0]!, title });
const rated = (tree: FaultTree, base: "rare" | "common") => putNode(tree, "causes", { ...tree.causes[0]!, base });

/** A server that keeps one draft as ours does, and can be cut off. */
class Server {
  draft: TreeDraft = {
    id: idOf(1),
    version: 1,
    title: "Small tree",
    begunFrom: idOf(2),
    takenUp: idOf(2),
    savedAt: "2026-06-01T10:00:00.000Z",
    by: "Mats",
    document: smallTree(),
  };
  reachable = true;
  gone = false;
  readonly saves: TreeEdit[] = [];
  whileOnItsWay = (): void => undefined;

  answer = (_path: string, { body, headers }: RequestInit): Response => {
    if (!this.reachable) throw new TypeError("failed to fetch");
    if (this.gone) return problem(404, {});
    const version = Number((headers as Record<string, string>)["if-match"]?.replaceAll('"', ""));
    const edit = JSON.parse(body as string) as TreeEdit;
    if (edit.draft !== this.draft.id || version !== this.draft.version) return problem(412, { current: this.draft });
    const applied = applyEdit(this.draft.document, edit);
    if ("refused" in applied) return problem(409, { detail: applied.refused });
    this.saves.push(edit);
    this.whileOnItsWay();
    this.draft = { ...this.draft, takenUp: edit.takesUp ?? this.draft.takenUp };
    this.save(applied.tree);
    return Response.json(this.draft);
  };

  save(document: FaultTree): void {
    this.draft = { ...this.draft, document, version: this.draft.version + 1 };
  }
}

const problem = (status: number, rest: object): Response =>
  Response.json({ type: "urn:x", title: "No", status, detail: "No", ...rest }, { status });

let server: Server;
const opened: Workbench[] = [];
const open = async (user = 1): Promise<Workbench> => {
  const bench = await resumeWorkbench(FLEET, new SessionKeeper(idOf(7000 + user), FLEET), server.draft);
  opened.push(bench);
  return bench;
};

beforeEach(() => {
  indexedDB = new IDBFactory();
  server = new Server();
  vi.stubGlobal("fetch", (path: string, init: RequestInit) => new Promise((done) => done(server.answer(path, init))));
});
afterEach(() => {
  for (const bench of opened.splice(0)) bench.close();
  vi.unstubAllGlobals();
});

describe("an edit in the workshop", () => {
  it("is saved with the version that it was made to, and only what it changed", async () => {
    const bench = await open();
    bench.edit(renamed(bench.session.get().tree, "Mine"), "Renamed");
    expect(bench.saving.get()).toEqual({ state: "waiting" });
    await bench.saveNow();
    expect(bench.saving.get()).toMatchObject({ state: "saved" });
    expect(server.saves).toMatchObject([{ says: "Renamed", changes: [{ list: "causes", key: first.key }] }]);
    expect(server.draft).toMatchObject({ version: 2, document: renamed(smallTree(), "Mine") });
  });

  it("joins what another mechanic saved meanwhile, both kept", async () => {
    const [mine, theirs] = [await open(1), await open(2)];
    theirs.edit(rated(smallTree(), "rare"), "Rarer");
    await theirs.saveNow();
    mine.edit(renamed(smallTree(), "Mine"), "Renamed");
    await mine.saveNow();
    expect(server.draft.document.causes[0]).toMatchObject({ title: "Mine", base: "rare" });
    expect(mine.session.get().collisions).toEqual([]);
    expect(mine.session.get().tree).toEqual(server.draft.document);
  });

  it("that collides waits for a choice; theirs stands until then, and mine can still be had", async () => {
    const mine = await open(1);
    server.save(renamed(smallTree(), "Theirs"));
    mine.edit(renamed(smallTree(), "Mine"), "Renamed");
    await mine.saveNow();
    expect(server.draft.document.causes[0]?.title).toBe("Theirs");
    const [collision] = mine.session.get().collisions;
    expect(collision).toMatchObject({ field: ["title"], mine: "Mine", theirs: "Theirs" });
    mine.choose(collision!, "mine");
    await mine.saveNow();
    expect(server.draft.document.causes[0]?.title).toBe("Mine");
    expect(mine.session.get().collisions).toEqual([]);
  });

  it("made with no signal is kept, is there after a reload with its undo, and goes ashore when the signal is back", async () => {
    server.reachable = false;
    const before = await open();
    before.edit(renamed(smallTree(), "At sea"), "Renamed");
    await before.saveNow();
    expect(before.saving.get()).toEqual({ state: "no-signal" });
    before.close();
    const after = await open();
    expect(after.session.get().tree.causes[0]?.title).toBe("At sea");
    server.reachable = true;
    await after.saveNow();
    expect(server.draft.document.causes[0]?.title).toBe("At sea");
    after.undo();
    await after.saveNow();
    expect(server.draft.document).toEqual(smallTree());
    after.redo();
    await after.saveNow();
    expect(server.draft.document.causes[0]?.title).toBe("At sea");
  });

  it("kept on this device joins what was saved elsewhere before the reload", async () => {
    server.reachable = false;
    const before = await open();
    before.edit(renamed(smallTree(), "At sea"), "Renamed");
    await before.saveNow();
    before.close();
    server.reachable = true;
    server.save(rated(smallTree(), "common"));
    const after = await open();
    await after.saveNow();
    expect(server.draft.document.causes[0]).toMatchObject({ title: "At sea", base: "common" });
  });

  it("cannot be undone where another changed the same since, and says so", async () => {
    const mine = await open(1);
    mine.edit(renamed(smallTree(), "Mine"), "Renamed");
    await mine.saveNow();
    server.save(renamed(smallTree(), "Theirs"));
    mine.edit(rated(mine.session.get().tree, "rare"), "Rarer");
    await mine.saveNow();
    mine.undo();
    expect(mine.refused.get()).toBeNull();
    mine.undo();
    expect(mine.refused.get()).toContain("changed since");
    expect(mine.session.get().tree.causes[0]?.title).toBe("Theirs");
  });

  it("to a draft that was published meanwhile says so and keeps the work on this device", async () => {
    const mine = await open();
    server.gone = true;
    mine.edit(renamed(smallTree(), "Mine"), "Renamed");
    await mine.saveNow();
    expect(mine.saving.get()).toEqual({ state: "gone" });
    expect((await new SessionKeeper(idOf(7001), FLEET).read(server.draft.id))?.tree.causes[0]?.title).toBe("Mine");
  });

  it("that a closed draft never saved is brought into the next one, and can be undone there", async () => {
    const before = await open();
    server.gone = true;
    before.edit(renamed(smallTree(), "Mine"), "Renamed");
    await before.saveNow();
    before.close();
    server.gone = false;
    server.draft = { ...server.draft, id: idOf(3), version: 1, document: rated(smallTree(), "common") };
    const after = await open();
    expect(after.session.get().tree.causes[0]).toMatchObject({ title: "Mine", base: "common" });
    await after.saveNow();
    expect(server.draft.document.causes[0]?.title).toBe("Mine");
    after.undo();
    await after.saveNow();
    expect(server.draft.document.causes[0]).toMatchObject({ title: first.title, base: "common" });
    expect(await new SessionKeeper(idOf(7001), FLEET).draftIds()).toEqual([idOf(3)]);
  });

  it("meant for a draft that was published is not made in the next one, even where that was saved as often", async () => {
    const mine = await open();
    const next = { ...server.draft, id: idOf(3), document: rated(smallTree(), "common") };
    server.draft = next;
    mine.edit(renamed(smallTree(), "Mine"), "Renamed");
    await mine.saveNow();
    expect(mine.saving.get()).toEqual({ state: "gone" });
    expect(server.draft).toEqual(next);
  });

  it("is not joined with others' unseen: an answer that tells of theirs shows it", async () => {
    const mine = await open();
    server.save(renamed(smallTree(), "Theirs"));
    expect(mine.takeIn(server.draft)).toBe(true);
    expect(mine.session.get()).toMatchObject({ saved: { version: 2 }, tree: renamed(smallTree(), "Theirs") });
    expect(mine.takeIn({ nothing: "of a draft" })).toBe(false);
    await mine.saveNow();
    expect(server.saves).toEqual([]);
  });

  it("left to be chosen when its draft was closed is still to be chosen in the next one", async () => {
    const before = await open();
    server.save(renamed(smallTree(), "Theirs"));
    before.edit(renamed(smallTree(), "Mine"), "Renamed");
    await before.saveNow();
    before.close();
    server.draft = { ...server.draft, id: idOf(3), version: 1 };
    const after = await open();
    expect(after.session.get().collisions).toMatchObject([{ field: ["title"], mine: "Mine", theirs: "Theirs" }]);
    const [collision] = after.session.get().collisions;
    after.choose(collision!, "mine");
    await after.saveNow();
    expect(server.draft.document.causes[0]?.title).toBe("Mine");
  });
});

describe("a newer shipped tree", () => {
  const newer = { id: idOf(4), document: rated(smallTree(), "rare") };

  it("taken up and undone counts as not taken up, before and after it was saved", async () => {
    const bench = await open();
    bench.takeUp(smallTree(), newer);
    await bench.saveNow();
    expect(server.draft).toMatchObject({ takenUp: newer.id, document: newer.document });
    bench.undo();
    await bench.saveNow();
    expect(server.draft).toMatchObject({ takenUp: idOf(2), document: smallTree() });
    bench.redo();
    await bench.saveNow();
    expect(server.draft).toMatchObject({ takenUp: newer.id, document: newer.document });
  });

  it("taken up while a save is on its way is said with the next", async () => {
    const bench = await open();
    server.whileOnItsWay = () => {
      server.whileOnItsWay = () => undefined;
      bench.takeUp(smallTree(), newer);
    };
    bench.edit(renamed(smallTree(), "Mine"), "Renamed");
    await bench.saveNow();
    expect(server.draft.takenUp).toBe(newer.id);
    expect(server.draft.document.causes[0]).toMatchObject({ title: "Mine", base: "rare" });
  });
});
