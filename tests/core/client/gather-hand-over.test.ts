import { describe, expect, it } from "vitest";
import { gatherHandOver } from "@/lib/client/hand-over/gather";
import type { Engine } from "@/lib/core/contract/engine";
import { CANNOT_TELL } from "@/lib/core/diagnosis/words";
import { view } from "@/lib/core/diagnosis/show";
import type { DiagnosisView, PossibleCause, Said } from "@/lib/core/diagnosis/view";
import { smallTree } from "../../support/small-tree";
import { BEGUN, makeEvent } from "./make-event";

const tree = smallTree();
const started = view(tree, [makeEvent("begun", { ...BEGUN, symptoms: [] }, { n: 1 })]);
const said = (title: string, says: string, more: Partial<Said> = {}): Said => ({
  ...{ event: title, kind: "answered", key: title, title, says, at: "", device: "", note: null, photos: [], mayChange: true },
  ...more,
});
const cause = (share: number, factors: Record<string, number>): PossibleCause => ({
  ...{
    key: "a",
    title: "A",
    is: "",
    share,
    of100: Math.round(share * 100),
    inAll: Math.round(share * 100),
    ofThisEngine: null,
    speaksAgainst: [],
    notChecked: [],
    behind: [],
  },
  speaksFor: Object.entries(factors).map(([title, factor]) => ({ title, says: "", factor })),
});
const engine = { boatName: "Corncrake", name: "port", hours: 51.71333796, hoursAreEstimated: true } as Engine;
const gather = (part: Partial<DiagnosisView>, of: Engine = engine) =>
  gatherHandOver({
    ...{ engine: of, tree, fleet: "Harbour boats", by: "Ada", complaint: null, minutes: 4, position: null },
    view: { ...started, ...part },
  });

describe("what goes into a hand-over", () => {
  it("puts the finding first that moved a likely cause most, and what could not be seen by itself", () => {
    const facts = gather({
      said: [said("Bowl", "Clear"), said("Vacuum", "High"), said("Bottom", CANNOT_TELL), said("Hose", "Soft")],
      possible: { ...started.possible, causes: [cause(0.6, { Vacuum: 9, Hose: 2 }), cause(0.02, { Bowl: 40 })] },
    });
    expect(facts.checked.map(({ title }) => title)).toEqual(["Vacuum", "Hose", "Bowl"]);
    expect(facts.notSeen).toEqual(["Bottom"]);
  });

  it("rounds the hours, and says where they are estimated", () => {
    expect(gather({}).hours).toBe("about 52 h, estimated");
    expect(gather({}, { ...engine, hours: 1225.4, hoursAreEstimated: false }).hours).toBe("1225 h at the last reading");
    expect(gather({}, { ...engine, hours: null }).hours).toBeNull();
  });

  it("takes notes and photos along, with what they belong to", () => {
    const facts = gather({ said: [said("Vacuum", "High", { note: "gauge bounces", photos: ["p1"] })] });
    expect(facts.notes).toEqual([{ title: "Vacuum", says: "gauge bounces" }]);
    expect(facts.photos).toEqual([{ id: "p1", title: "Vacuum" }]);
  });
});
