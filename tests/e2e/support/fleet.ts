import { type APIRequestContext, expect } from "@playwright/test";
import type { Engine } from "../../../lib/core/contract/engine";
import type { LogEntry } from "../../../lib/core/contract/log";
import type { FaultTree } from "../../../lib/core/tree/schema";

/** What a signed-in person's fleet holds, read through the API as any program would. */
export class Fleet {
  private constructor(
    readonly request: APIRequestContext,
    readonly id: string,
  ) {}

  static async of(request: APIRequestContext): Promise<Fleet> {
    const me = await Fleet.#json<{ fleets: { id: string }[] }>(request, "/api/v1/me");
    return new Fleet(request, me.fleets[0]!.id);
  }

  async engine(boat: string, name?: string): Promise<Engine> {
    const { items } = await this.get<{ items: Engine[] }>("engines");
    const found = items.find((e) => e.boatName === boat && (name === undefined || e.name === name));
    if (!found) throw new Error(`No engine of ${boat}`);
    return found;
  }

  async log(engineId: string): Promise<LogEntry[]> {
    return (await this.get<{ items: LogEntry[] }>(`engines/${engineId}/log?limit=200`)).items;
  }

  async tree(): Promise<{ id: string; document: FaultTree }> {
    const { items } = await this.get<{ items: { id: string }[] }>("trees");
    return this.get(`trees/versions/${items[0]!.id}`);
  }

  get<T>(path: string): Promise<T> {
    return Fleet.#json(this.request, `/api/v1/fleets/${this.id}/${path}`);
  }

  static async #json<T>(request: APIRequestContext, path: string): Promise<T> {
    const response = await request.get(path);
    expect(response.status(), path).toBe(200);
    return (await response.json()) as T;
  }
}
