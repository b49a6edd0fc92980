import "fake-indexeddb/auto";
import { beforeAll, describe, expect, it } from "vitest";
import { begin } from "@/lib/client/begin";
import { emptyDraft } from "@/lib/client/store/draft";
import { PhoneStore } from "@/lib/client/store/phone-store";
import type { Engine } from "@/lib/core/contract/engine";
import type { Phone } from "@/lib/core/contract/phone";
import { view } from "@/lib/core/diagnosis/show";
import type { FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "@/tests/support/shipped-tree";
import { idOf } from "./make-event";

const engine = (n: number, features: Record<string, string> = {}) =>
  ({ id: idOf(n), boatId: idOf(50), name: `engine ${n}`, profile: { features, figures: {}, healthy: {} } }) as unknown as Engine;

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

/** Begins on the first of these engines, and gives what a screen then shows. */
async function begun(engines: readonly Engine[], said: string | null) {
  const store = new PhoneStore(idOf(7001), idOf(6001), idOf(8001));
  const phone = { engines, boats: [], multipliers: {}, treeVersion: { id: idOf(2) } } as unknown as Phone;
  const draft = { ...emptyDraft(engines[0]!.id, false), situation: "alongside" as const, otherEngine: said };
  const id = await begin({ store, phone, engine: engines[0]!, tree, draft, symptoms: ["lost-top-end-rpm"] });
  return view(
    tree,
    (await store.events(id)).map(({ event }) => event),
  );
}
const TWINS = [engine(1), engine(2)];
const share = (shown: Awaited<ReturnType<typeof begun>>, cause: string) =>
  shown.possible.causes.find(({ key }) => key === cause)?.share ?? 0;

describe("does the other engine do it too?", () => {
  it("moves belief to what twins share when it does, and away from it when it does not", async () => {
    const [both, onlyThis, unsaid] = [await begun(TWINS, "both"), await begun(TWINS, "only-this"), await begun(TWINS, null)];
    expect(share(both, "hull-fouled")).toBeGreaterThan(2 * share(unsaid, "hull-fouled"));
    expect(share(onlyThis, "hull-fouled")).toBeLessThan(share(unsaid, "hull-fouled") / 2);
  });

  it("stands among the answers, where it can be changed like any other, and so does that nobody can tell", async () => {
    const saidOf = async (said: string) => (await begun(TWINS, said)).said.find(({ key }) => key === "other-engine");
    expect(await saidOf("both")).toMatchObject({ kind: "answered", says: "The other does it too", mayChange: true });
    expect(await saidOf("cannot-tell")).toMatchObject({ kind: "answered", mayChange: true });
  });

  it("is asked of nobody who has one engine, whatever was kept in the draft", async () => {
    expect((await begun([engine(1)], "both")).said.map(({ key }) => key)).not.toContain("other-engine");
    expect((await begun([engine(1)], null)).profile.features["second-engine"]).toBe("not-fitted");
  });

  it("goes by the profile where that knows of a second engine that the fleet does not list", async () => {
    expect((await begun([engine(1, { "second-engine": "fitted" })], "both")).said.map(({ key }) => key)).toContain("other-engine");
  });

  it("takes an answer that an earlier version kept for none", async () => {
    expect((await begun(TWINS, "does")).said.map(({ key }) => key)).not.toContain("other-engine");
  });
});
