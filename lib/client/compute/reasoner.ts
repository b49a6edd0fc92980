import type { DiagnosisEvent } from "@/lib/core/contract/event";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { view } from "@/lib/core/diagnosis/show";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import { whatIf, type WhatIf } from "@/lib/core/diagnosis/what-if";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Ask, Told } from "./protocol";

class WorkerDied extends Error {}

/**
 * Asks the diagnosis core what to show; in a worker, or here where that is not
 * to be had. The core comes with the page, since a part that is fetched when it
 * is first needed is not there without a signal.
 */
export class Reasoner {
  #worker: Worker | null = null;
  #kept = new Set<string>();
  #waiting = new Map<number, { done: (told: Told) => void; failed: (why: Error) => void }>();
  #next = 1;
  #models = keepModels();

  /** Fetches and starts the worker while there is a signal, so that the first question is answered without one. */
  warm(): void {
    this.#start();
  }

  /** Lets go of the worker and all its trees. Asked again, it starts another; what was asked before is not answered. */
  close(): void {
    this.#worker?.terminate();
    this.#worker = null;
    this.#kept.clear();
    this.#waiting.clear();
  }

  async view(version: string, tree: FaultTree, events: readonly DiagnosisEvent[]): Promise<DiagnosisView> {
    const told = await this.#askWorker("view", version, tree, events);
    // Slower, and the screen waits; but there is a next step.
    return told && "view" in told ? told.view : view(tree, events, this.#models);
  }

  /** What would come next on each answer, and what the ranking hangs on: for whoever wants to look behind the step. */
  async whatIf(version: string, tree: FaultTree, events: readonly DiagnosisEvent[]): Promise<WhatIf> {
    const told = await this.#askWorker("what-if", version, tree, events);
    return told && "whatIf" in told ? told.whatIf : whatIf(tree, events, this.#models);
  }

  /** null: there is no worker, or it died over the question. */
  async #askWorker(ask: "view" | "what-if", version: string, tree: FaultTree, events: readonly DiagnosisEvent[]): Promise<Told | null> {
    try {
      const worker = this.#start();
      return worker && (await this.#ask(worker, ask, version, tree, events));
    } catch (failure) {
      if (!(failure instanceof WorkerDied)) throw failure;
      return null;
    }
  }

  #ask(worker: Worker, ask: "view" | "what-if", version: string, tree: FaultTree, events: readonly DiagnosisEvent[]): Promise<Told> {
    if (!this.#kept.has(version)) {
      this.#kept.add(version);
      worker.postMessage({ ask: "keep-tree", version, tree } satisfies Ask);
    }
    const id = this.#next++;
    return new Promise((done, failed) => {
      this.#waiting.set(id, { done, failed });
      worker.postMessage({ ask, id, version, events } satisfies Ask);
    });
  }

  #start(): Worker | null {
    if (this.#worker) return this.#worker;
    try {
      this.#worker = new Worker(new URL("./diagnosis-worker.ts", import.meta.url), { type: "module" });
    } catch {
      return null;
    }
    this.#worker.onmessage = ({ data }: MessageEvent<Told>) => {
      const waiting = this.#waiting.get(data.id);
      this.#waiting.delete(data.id);
      if ("failure" in data) waiting?.failed(new Error(data.failure));
      else waiting?.done(data);
    };
    this.#worker.onerror = () => {
      // A worker that died, or was never fetched, takes its questions with it; the next question starts another.
      this.#worker = null;
      this.#kept.clear();
      for (const { failed } of this.#waiting.values()) failed(new WorkerDied());
      this.#waiting.clear();
    };
    return this.#worker;
  }
}
