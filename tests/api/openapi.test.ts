import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { GET } from "@/app/api/v1/openapi.json/route";
import { routes } from "@/app/api/v1/routes";

const root = path.resolve(import.meta.dirname, "../../app/api/v1");
const VERBS = ["GET", "POST", "PUT", "PATCH", "DELETE", "HEAD", "OPTIONS"];

type Description = {
  openapi: string;
  paths: Record<string, Record<string, { operationId: string; responses: Record<string, { content?: Record<string, unknown> }> }>>;
};
const described = async () =>
  (await (await GET(new Request("http://localhost/api/v1/openapi.json"), { params: Promise.resolve({}) })).json()) as Description;

/** What the folders say there is: "POST /fleets/{fleetId}/boats". */
const served = readdirSync(root, { recursive: true, encoding: "utf8" })
  .filter((file) => path.basename(file) === "route.ts")
  .flatMap((file) => {
    const source = readFileSync(path.join(root, file), "utf8");
    const address = `/${path.dirname(file)}`.replaceAll(/\[(\w+)\]/g, "{$1}");
    return VERBS.filter((verb) => new RegExp(`export (const|async function|function) ${verb}\\b`).test(source)).map(
      (verb) => `${verb} ${address}`,
    );
  })
  .sort();

describe("openapi.json", () => {
  test("describes every route that is served, and no other", async () => {
    const { paths } = await described();
    const told = Object.entries(paths).flatMap(([address, verbs]) =>
      Object.keys(verbs).map((verb) => `${verb.toUpperCase()} ${address.replace("/api/v1", "")}`),
    );
    expect(told.sort()).toEqual(served);
    expect(served.length).toBeGreaterThan(25);
  });

  test("gives every operation a name of its own and its refusals as problems", async () => {
    const operations = Object.values((await described()).paths).flatMap((verbs) => Object.values(verbs));
    expect(new Set(operations.map((operation) => operation.operationId)).size).toBe(operations.length);
    for (const { responses } of operations) {
      for (const [status, response] of Object.entries(responses)) {
        if (Number(status) >= 400) expect(Object.keys(response.content ?? {})).toEqual(["application/problem+json"]);
      }
    }
  });

  test("a change or removal of a thing that two may edit asks for its version", () => {
    for (const [address, verbs] of Object.entries(routes)) {
      if (verbs.PATCH) expect([address, verbs.PATCH.spec.versioned]).toEqual([address, true]);
      // An invitation has no versions: it is withdrawn or it is not.
      if (verbs.DELETE && !address.includes("invitation")) expect([address, verbs.DELETE.spec.versioned]).toEqual([address, true]);
    }
  });
});
