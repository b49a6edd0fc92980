import { afterEach, describe, expect, it, vi } from "vitest";
import { Reasoner } from "@/lib/client/compute/reasoner";
import type { Ask, Told } from "@/lib/client/compute/protocol";
import { view } from "@/lib/core/diagnosis/show";
import { whatIf } from "@/lib/core/diagnosis/what-if";
import { smallTree } from "../../support/small-tree";
import { BEGUN, makeEvent } from "./make-event";

const tree = smallTree();
const log = [makeEvent("begun", { ...BEGUN, symptoms: [tree.symptoms[0]!.key] }, { n: 1 })];

/** A worker that does with each question what the test says. */
function workerThat(answers: (worker: { onmessage: (said: { data: Told }) => void; onerror: () => void }, ask: Ask) => void) {
  const started: unknown[] = [];
  vi.stubGlobal(
    "Worker",
    class {
      onmessage = (said: { data: Told }) => void said;
      onerror = () => undefined;
      constructor() {
        started.push(this);
      }
      postMessage(ask: Ask) {
        if (ask.ask !== "keep-tree") queueMicrotask(() => answers(this, ask));
      }
    },
  );
  return started;
}

afterEach(() => {
  vi.unstubAllGlobals();
});

describe("asking for the next step", () => {
  it("is answered here where the browser has no worker", async () => {
    expect(await new Reasoner().view("1", tree, log)).toEqual(view(tree, log));
  });

  it("is answered here where the worker died or could not be fetched, and a new one is tried the next time", async () => {
    const started = workerThat((worker) => worker.onerror());
    const reasoner = new Reasoner();
    expect(await reasoner.view("1", tree, log)).toEqual(view(tree, log));
    await reasoner.view("1", tree, log);
    expect(started).toHaveLength(2);
  });

  it("looks behind the step in the worker, and here where there is none", async () => {
    const own = await new Reasoner().whatIf("1", tree, log);
    expect(own).toEqual(whatIf(tree, log));
    expect(own.next.length).toBeGreaterThan(1);
    workerThat((worker, ask) => ask.ask === "what-if" && worker.onmessage({ data: { id: ask.id, whatIf: own } }));
    expect(await new Reasoner().whatIf("1", tree, log)).toBe(own);
  });

  it("says why where the reckoning itself failed", async () => {
    workerThat((worker, ask) => ask.ask === "view" && worker.onmessage({ data: { id: ask.id, failure: "no such check" } }));
    await expect(new Reasoner().view("1", tree, log)).rejects.toThrow("no such check");
  });

  it("lets go of its worker when it is closed, and starts another when it is asked again", async () => {
    const ended: unknown[] = [];
    const started = workerThat((worker, ask) => ask.ask === "view" && worker.onmessage({ data: { id: ask.id, view: view(tree, log) } }));
    const reasoner = new Reasoner();
    await reasoner.view("1", tree, log);
    Object.assign(started[0]!, { terminate: () => ended.push(started[0]) });
    reasoner.close();
    expect(ended).toEqual(started);
    expect(await reasoner.view("1", tree, log)).toEqual(view(tree, log));
    expect(started).toHaveLength(2);
  });
});
